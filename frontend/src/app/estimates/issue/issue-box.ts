import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { Finding } from '#shared/words/finding';
import { letterFindings } from '#shared/words/letter-findings';
import { Formats } from '../../core/formats/formats';
import { Notices } from '../../core/problems/notices';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { FindingList } from '../../ui/page/finding-list';
import { EstimateStore } from '../estimate-store';
import { distinctFindings } from './distinct-findings';
import { findingPlace } from './finding-place';
import { IssueParts } from './issue-parts';
import { Issuing } from './issuing';
import { LettersNotPrinted } from './letters-not-printed';

const stopping: readonly Finding['kind'][] = ['refuse', 'missing'];
const told: readonly Finding['kind'][] = ['caution', 'note'];

/** What stands in the way of the next issue, a note to it, and the button that makes it. */
@Component({
  selector: 'app-issue-box',
  imports: [Entry, Field, FindingList, FormComplaint, MatButton, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [Issuing, LettersNotPrinted],
  templateUrl: './issue-box.html',
  styleUrl: './issue-box.scss',
})
export class IssueBox {
  private readonly router = inject(Router);
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  protected readonly store = inject(EstimateStore);
  protected readonly parts = inject(IssueParts);
  protected readonly issuing = inject(Issuing);

  private readonly letters = inject(LettersNotPrinted);

  protected readonly note = signal('');
  protected readonly acceptsOldCard = signal(false);
  private readonly findings = computed(() => [
    ...(this.store.figures()?.findings ?? []),
    ...(this.store.costed()?.cost.findings ?? []),
    ...this.letters.findings(),
    ...letterFindings([{ part: 'note', name: '', text: this.note() }]),
  ]);
  protected readonly stopping = computed(() => this.findings().filter(({ kind }) => stopping.includes(kind)));
  protected readonly warnings = computed(() => distinctFindings(this.findings().filter(({ kind }) => kind === 'warn')));
  protected readonly others = computed(() =>
    distinctFindings(this.findings().filter(({ kind }) => told.includes(kind))),
  );
  protected readonly gross = computed(() => this.formats.money(this.store.priced()?.price.gross_minor ?? 0));

  /** Goes where what a finding speaks of is entered. */
  protected goTo({ about }: Finding): void {
    const draft = this.store.draft();
    const found = draft && findingPlace(draft, about);
    const opened = this.store.ids();
    if (!found || !opened) return;
    const path = ['/jobs', opened.jobId, 'estimates', opened.estimateId, found.place];
    void this.router.navigate(path, { queryParams: found.query });
  }

  protected async press(): Promise<void> {
    const issue = await this.issuing.press({ note: this.note(), acceptsOldCard: this.acceptsOldCard() });
    if (!issue) return;
    this.notices.say($localize`Issue ${issue.letter}:letter: is made, with its papers.`);
    await this.router.navigateByUrl(this.parts.issueRoute(issue.id));
  }
}
