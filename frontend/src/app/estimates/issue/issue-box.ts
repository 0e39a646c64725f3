import { ChangeDetectionStrategy, Component, computed, inject, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { TaxCode } from '#shared/money/tax-codes';
import type { Finding } from '#shared/words/finding';
import { letterFindings } from '#shared/words/letter-findings';
import { Formats } from '../../core/formats/formats';
import { taxCodeNames } from '../../core/formats/tax-code-names';
import { Notices } from '../../core/problems/notices';
import { Session } from '../../core/session/session';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { FindingList } from '../../ui/page/finding-list';
import { EstimateStore } from '../estimate-store';
import { distinctFindings, type ToldFinding } from './distinct-findings';
import { findingPlace } from './finding-place';
import { IssueParts } from './issue-parts';
import { Issuing } from './issuing';
import { LettersNotPrinted } from './letters-not-printed';
import { membersSpokenOf } from './members-spoken-of';

const stopping: readonly Finding['kind'][] = ['refuse', 'missing'];

/** So many members are named beneath a finding; more are counted. */
const named = 4;

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
  private readonly session = inject(Session);
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
  private readonly told = computed(() => distinctFindings(this.findings()));
  private readonly places = computed(() => new Map(this.told().map((told) => [told.finding, this.membersOf(told)])));
  protected readonly stopping = computed(() => this.findings().filter(({ kind }) => stopping.includes(kind)));
  protected readonly warnings = computed(() => this.toldOf(['warn']));
  protected readonly others = computed(() => this.toldOf(['caution', 'note']));
  protected readonly where = (finding: Finding): string =>
    this.places().get(finding) ?? this.membersOf({ finding, about: finding.about ? [finding.about] : [] });
  /** What came into force a moment ago is heard of before it is said that nothing stops the issue. */
  private readonly look = resource({
    params: () => this.store.head()?.id,
    loader: () => this.store.lookAgain(),
  });
  protected readonly isReady = computed(
    () => this.look.status() === 'resolved' && this.stopping().length === 0 && !this.issuing.isCardOld(),
  );
  protected readonly acceptedLetter = computed(
    () => this.store.issues().find(({ state }) => state === 'accepted')?.letter,
  );
  /** The workshop's usual tax, where no part of the price is under it. */
  protected readonly usualTax = computed(() => {
    const usual = this.session.workshop()?.defaultTaxCategory as TaxCode | undefined;
    const taxes = this.store.priced()?.price.taxes ?? [];
    const isElsewhere = usual && taxes.length > 0 && taxes.every(({ tax }) => tax.code !== usual);
    return isElsewhere ? taxCodeNames[usual] : '';
  });
  protected readonly jobRoute = computed(() => ['/jobs', this.store.ids()?.jobId ?? '']);
  protected readonly isTaxed = computed(() => (this.store.priced()?.price.tax_minor ?? 0) !== 0);
  protected readonly gross = computed(() => this.formats.money(this.store.priced()?.price.gross_minor ?? 0));

  private toldOf(kinds: readonly Finding['kind'][]): Finding[] {
    return this.told()
      .map(({ finding }) => finding)
      .filter(({ kind }) => kinds.includes(kind));
  }

  private membersOf({ about }: ToldFinding): string {
    const draft = this.store.draft();
    const names = draft ? membersSpokenOf(draft, about) : [];
    if (names.length <= named) return names.join(', ');
    return $localize`${names.slice(0, named).join(', ')}:names: and ${names.length - named}:count: more`;
  }

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
