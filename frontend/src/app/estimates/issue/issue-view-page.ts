import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { CostedEstimate } from '#shared/estimates/estimate-schema';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { Formats } from '../../core/formats/formats';
import { netAndGrossText } from '../../core/formats/net-and-gross-text';
import { EmptyState } from '../../ui/page/empty-state';
import { LaterWidget } from '../../ui/page/later-widget';
import { Skeleton } from '../../ui/page/skeleton';
import { EstimateStore } from '../estimate-store';
import { PartList } from '../parts/part-list';
import { PartPlace } from '../parts/part-place';
import { narrowScreen } from '../../ui/screen/narrow-screen';
import { PlaceExplanation } from '../places/place-explanation';
import { MoneyBar } from '../price/money-bar';
import { DifferenceTable } from '../price/difference-table';
import { PriceLines } from '../price/price-lines';
import { FrozenAlternatives } from './frozen-alternatives';
import { FrozenDates } from './frozen-dates';
import { FrozenPayments } from './frozen-payments';
import { FrozenTexts } from './frozen-texts';
import { IssueClient } from './issue-client';
import { IssueFacts } from './issue-facts';
import { IssuePapers } from './issue-papers';
import { IssueParts } from './issue-parts';
import { MarkForm } from './mark-form';
import { Validity } from './validity';

/** An issue as it was frozen: its figures, what was new in it, its papers, and where it stands with the client. */
@Component({
  selector: 'app-issue-view-page',
  imports: [
    DifferenceTable,
    EmptyState,
    FrozenAlternatives,
    FrozenDates,
    FrozenPayments,
    FrozenTexts,
    IssueFacts,
    IssuePapers,
    MarkForm,
    MatButton,
    MoneyBar,
    LaterWidget,
    NgTemplateOutlet,
    PartList,
    PartPlace,
    PriceLines,
    Skeleton,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [IssueParts, PlaceExplanation, Validity],
  templateUrl: './issue-view-page.html',
  styleUrl: './issue-page.scss',
})
export class IssueViewPage {
  private readonly client = inject(IssueClient);
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);
  protected readonly parts = inject(IssueParts);

  /** Without a column of its own, state and papers stand before the figures. */
  protected readonly isNarrow = narrowScreen();
  readonly issueId = input.required<string>();

  protected readonly read = resource({
    params: () => this.issueId(),
    loader: ({ params, abortSignal }) => this.client.read(params, abortSignal),
  });
  protected readonly issue = computed(() => (this.read.hasValue() ? this.read.value() : undefined));
  protected readonly problem = computed(() => this.read.error()?.message ?? '');
  protected readonly memberNames = computed(
    () => new Map((this.issue()?.estimate.members ?? []).map(({ id, content }) => [id, content.name])),
  );
  /** The cost side, for those who may see it. */
  protected readonly cost = computed(() => {
    const estimate = this.issue()?.estimate;
    return estimate && 'cost' in estimate.figures ? (estimate as CostedEstimate).figures.cost.price : undefined;
  });
  protected readonly mayBeMarked = computed(() => {
    const state = this.issue()?.summary.state;
    return state === 'issued' || state === 'sent';
  });
  protected readonly before = computed(() => {
    const issues = this.store.issues();
    const place = issues.findIndex(({ id }) => id === this.issueId());
    const letter = issues.at(place + 1)?.letter;
    return place >= 0 && letter ? $localize`Issue ${letter}:letter:` : '';
  });
  protected readonly net_minor = computed(() => this.issue()?.summary.net_minor ?? 0);
  protected readonly sums = computed(() => netAndGrossText(this.formats, this.issue()?.summary));
  /** What the client accepted it at. */
  protected readonly agreedSums = computed(() => netAndGrossText(this.formats, this.issue()?.summary.agreed));

  constructor() {
    inject(PlaceExplanation);
  }

  /** What the client was sent has another state now. */
  private readonly wentOut = (): void => {
    this.read.reload();
    this.store.reloadIssues();
  };
  protected readonly sendingInputs = computed(() => ({
    issue: this.issue()?.summary,
    jobId: this.store.ids()?.jobId,
    sent: this.wentOut,
  }));

  protected take(summary: PricedIssueSummary): void {
    this.read.update((issue) => issue && { ...issue, summary: { ...issue.summary, ...summary } });
    this.store.reloadIssues();
  }
}
