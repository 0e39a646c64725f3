import { ChangeDetectionStrategy, Component, computed, effect, inject, input, resource, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { accessRequestSchema, type Access } from '#shared/agreements/access-schema';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { Formats } from '../core/formats/formats';
import { schemaForm } from '../core/forms/schema-form';
import { NOW } from '../core/now';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Confirm } from '../ui/dialog/confirm';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { accessState, isOpenAccess } from './access-state';
import { AgreementCalls } from './agreement-calls';

/** Gives the client of an issue a private link, by mail or to be passed on by hand, and shows which links there are. */
@Component({
  selector: 'app-issue-sending',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './issue-sending.html',
  styleUrl: './issue-sending.scss',
})
export class IssueSending {
  private readonly calls = inject(AgreementCalls);
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly confirm = inject(Confirm);
  private readonly now = inject(NOW);

  readonly issue = input.required<PricedIssueSummary>();
  readonly jobId = input.required<string>();
  /** Called when the issue went out, since its state follows. */
  readonly sent = input<() => void>(() => undefined);

  protected readonly form = schemaForm(accessRequestSchema, { endsOn: '', send: true, note: '' });
  /** The link, which this page alone ever shows, once. */
  protected readonly link = signal('');
  protected readonly isCopied = signal(false);
  protected readonly accesses = resource({
    params: () => this.jobId(),
    loader: ({ params, abortSignal }) => this.calls.accesses(params, abortSignal),
  });
  protected readonly rows = computed(() => {
    const accesses = this.accesses.hasValue() ? this.accesses.value() : [];
    const links = accesses.filter(({ purpose }) => purpose === 'link');
    return links.map((access) => ({
      access,
      given: $localize`${this.formats.dayOf(access.createdAt, 'short')}:day:, by ${access.createdBy}:who:`,
      state: accessState(access, this.formats, this.now()),
      isOpen: isOpenAccess(access, this.now()),
    }));
  });
  protected readonly mayBeSent = computed(() => ['issued', 'sent'].includes(this.issue().state));

  constructor() {
    effect(() => this.form.reset({ endsOn: this.issue().validUntil, send: true, note: '' }));
  }

  protected async give(): Promise<void> {
    const wasGiven = await this.form.send(async (body) => {
      const { link } = await this.calls.giveAccess(this.issue().id, body);
      this.link.set(link);
      if (body.send) this.notices.say($localize`The letter is on its way.`);
    });
    if (!wasGiven) return;
    this.isCopied.set(false);
    this.accesses.reload();
    this.sent()();
  }

  protected async copy(): Promise<void> {
    try {
      await globalThis.navigator.clipboard.writeText(this.link());
      this.isCopied.set(true);
    } catch {
      this.notices.complain($localize`The browser does not let it be copied. Select the link and copy it by hand.`);
    }
  }

  protected async revoke(access: Access): Promise<void> {
    const isSure = await this.confirm.ask({
      heading: $localize`Take the link back?`,
      text: $localize`It opens nothing from now on, and whoever reads by it is shown out. What was asked and decided stays.`,
      yes: $localize`Take it back`,
    });
    if (!isSure) return;
    try {
      await this.calls.revoke(access.id);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    }
    this.accesses.reload();
  }
}
