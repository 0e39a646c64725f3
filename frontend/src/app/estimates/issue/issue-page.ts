import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../../core/formats/formats';
import { netAndGrossText } from '../../core/formats/net-and-gross-text';
import { EstimateStore } from '../estimate-store';
import { PartList } from '../parts/part-list';
import { PartPlace } from '../parts/part-place';
import { narrowScreen } from '../../ui/screen/narrow-screen';
import { PlaceExplanation } from '../places/place-explanation';
import { AlternativeTotals } from '../price/alternative-totals';
import { DifferenceTable } from '../price/difference-table';
import { PresentationChoice } from '../price/presentation-choice';
import { BenchSheets } from './bench-sheets';
import { IssueBox } from './issue-box';
import { IssueClient } from './issue-client';
import { draftKey, IssueParts } from './issue-parts';
import { IssueTextsForm } from './issue-texts-form';
import { Letterhead } from './letterhead';
import { PaperPreview } from './paper-preview';
import { Validity } from './validity';

/** Issue: the draft as it would go out next, what is new in it, what its paper says; and the issues made so far. */
@Component({
  selector: 'app-issue-page',
  imports: [
    BenchSheets,
    DifferenceTable,
    IssueBox,
    IssueTextsForm,
    NgTemplateOutlet,
    PaperPreview,
    PartList,
    PartPlace,
    PresentationChoice,
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [AlternativeTotals, IssueParts, Letterhead, PlaceExplanation, Validity],
  templateUrl: './issue-page.html',
  styleUrl: './issue-page.scss',
})
export class IssuePage {
  private readonly client = inject(IssueClient);
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);
  protected readonly parts = inject(IssueParts);

  /** Without a column of its own, issuing stands before what it speaks of. */
  protected readonly isNarrow = narrowScreen();
  /** The draft, where the address asks for it: on a phone it is shown instead of the list. */
  readonly part = input<string>();

  private readonly differencesRead = resource({
    // Another version of the draft, or another newest issue, differs otherwise.
    params: () => {
      const head = this.store.head();
      const letter = this.store.issues().at(0)?.letter;
      return head && letter ? { id: head.id, version: head.version, letter } : undefined;
    },
    loader: ({ params, abortSignal }) => this.client.differences(params.id, abortSignal),
  });
  protected readonly differences = computed(() =>
    this.differencesRead.hasValue() ? this.differencesRead.value() : undefined,
  );
  protected readonly before = computed(() => $localize`Issue ${this.differences()?.letter ?? ''}:letter:`);
  protected readonly differenceText = computed(() => {
    const changes = (this.differences()?.lines ?? []).map(
      ({ before_minor, after_minor }) => (after_minor ?? 0) - (before_minor ?? 0),
    );
    const sum_minor = sumMinor(changes);
    return this.formats.signed(sum_minor, (size_minor) => this.formats.money(size_minor));
  });
  protected readonly sums = computed(() => netAndGrossText(this.formats, this.store.priced()?.price));
  protected readonly draftKey = draftKey;

  constructor() {
    inject(PlaceExplanation);
  }

  protected present(presentation: 'members' | 'kinds'): void {
    this.store.changeSettings({ presentation });
  }
}
