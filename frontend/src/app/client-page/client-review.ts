import { ChangeDetectionStrategy, Component, computed, inject, output, resource } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { acceptIssue, readClientPaper, reviewClientChoice } from '#shared/client-page/client-issues-endpoints';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { isOutsideTax } from '#shared/money/is-outside-tax';
import { Api } from '../core/api/api';
import { addressOf } from '../core/api/address-of';
import { schemaForm } from '../core/forms/schema-form';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import { newId } from '../core/new-id';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { Skeleton } from '../ui/page/skeleton';
import { ClientIssueStore } from './client-issue-store';
import { acceptanceFormSchema } from './acceptance-form';
import { takenAway } from './taken-away';

/** The last look: what was chosen, what it comes to, the paper itself; a typed name and a tick accept it. */
@Component({
  selector: 'app-client-review',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-review.html',
  styleUrl: './client-review.scss',
})
export class ClientReview {
  private readonly api = inject(Api);
  protected readonly store = inject(ClientIssueStore);
  protected readonly formats = inject(Formats);
  private readonly words = inject(Words);

  protected readonly besides = $localize`Besides`;

  readonly left = output();
  readonly accepted = output();

  protected readonly form = schemaForm(acceptanceFormSchema, { typedName: '', agrees: false });
  /** One key for this look: a second press, or a second try after a lost answer, accepts nothing twice. */
  private readonly key = newId();

  private readonly reviewing = resource({
    params: () => this.issueChosen(),
    loader: ({ params: { issueId, choice }, abortSignal }) =>
      this.api.call(reviewClientChoice, { params: { issueId }, body: { choice }, signal: abortSignal }),
  });
  protected readonly review = computed(() => (this.reviewing.hasValue() ? this.reviewing.value() : undefined));
  protected readonly problem = computed(() => this.reviewing.error()?.message ?? '');
  protected readonly chosen = computed(() => {
    const offered: ClientIssue['alternatives'] = this.store.issue()?.alternatives ?? [];
    return offered.filter(({ id }) => this.store.choice().includes(id));
  });
  protected readonly isVariation = computed(() => this.store.issue()?.issue.kind === 'variation');
  protected readonly takenAway = computed(() =>
    takenAway({ words: this.words, formats: this.formats }, this.review()?.price),
  );
  protected readonly mayBeTaxed = computed(() => !isOutsideTax(this.review()?.price.taxes ?? []));
  protected readonly firstPayment = computed(() => this.review()?.price.payments[0]?.paid_minor);
  protected readonly paper = computed(() => {
    const chosen = this.issueChosen();
    return chosen
      ? addressOf(readClientPaper, { params: { issueId: chosen.issueId }, query: { choice: chosen.choice.join(',') } })
      : '';
  });

  protected async accept(): Promise<void> {
    const chosen = this.issueChosen();
    const review = this.review();
    if (!chosen || !review) return;
    const params = { issueId: chosen.issueId };
    const seen = { gross_minor: review.price.gross_minor, pdfSha256: review.pdfSha256 };
    const wasAccepted = await this.form.send(async ({ typedName }) => {
      const body = { typedName, agrees: true, choice: chosen.choice, ...seen } as const;
      this.store.decided(await this.api.call(acceptIssue, { params, body, idempotencyKey: this.key }));
    });
    if (wasAccepted) this.accepted.emit();
  }

  private issueChosen(): { issueId: string; choice: string[] } | undefined {
    const issue = this.store.issue();
    return issue && { issueId: issue.issue.id, choice: [...this.store.choice()] };
  }
}
