import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import type { UseFigures } from '#shared/estimates/figures';
import type { Triple } from '#shared/units/triple';
import { tripleSum } from '#shared/units/triple-sum';
import { gradeHours, HoursTable, stageHours } from '../../carving';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { EmptyState } from '../../ui/page/empty-state';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { PlaceExplanation } from '../places/place-explanation';
import { OrnamentColumns } from './ornament-columns';

/** One ornament over the whole job. */
interface OrnamentSum {
  readonly name: string;
  readonly quantity: number;
  readonly hours: Triple;
}

function sumsOf(uses: readonly UseFigures[]): OrnamentSum[] {
  const names = [...new Set(uses.map(({ ornament }) => ornament))];
  return names.map((name) => {
    const own = uses.filter(({ ornament }) => ornament === name);
    return {
      name,
      quantity: own.reduce((sum, { quantity }) => sum + quantity, 0),
      hours: tripleSum(own.map(({ carving }) => carving)),
    };
  });
}

/** The carving of the whole job: by ornament, by stage and by grade. */
@Component({
  selector: 'app-whole-carving',
  imports: [EmptyState, Figure, FigureTable, HoursTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (byStage().length > 0) {
      <header>
        <h2 i18n>Carving of the whole job</h2>
        <p>
          <app-figure class="sum" [text]="total().heading" [explained]="total()" />
          <span class="muted">{{ range() }}</span>
        </p>
      </header>
      <app-figure-table
        captionShown
        i18n-caption
        caption="By ornament"
        [columns]="columns"
        [rows]="sums()"
        [rowId]="nameOf"
      />
      <div class="tables">
        <app-hours-table i18n-caption caption="By stage" [rows]="byStage()" />
        <app-hours-table i18n-caption caption="By grade" [rows]="byGrade()" [showsGrade]="false" />
      </div>
    } @else {
      <app-empty-state
        icon="edit"
        i18n-heading
        heading="Nothing is carved yet"
        i18n-text
        text="Choose a member and add its ornaments: each brings its hours from the rate card, for its size, timber and relief."
      />
    }
  `,
  styleUrl: '../places/member-content.scss',
})
export class WholeCarving {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);
  private readonly ornamentColumns = inject(OrnamentColumns);

  private readonly carving = computed(() => this.store.figures()?.carving);
  private readonly grades = computed(
    () => this.store.figures()?.grades.map(({ gradeId: id, name }) => ({ id, name })) ?? [],
  );
  protected readonly sums = computed(() => sumsOf(this.store.figures()?.uses ?? []));
  protected readonly byStage = computed(() =>
    stageHours(this.carving()?.rows ?? [], this.carving()?.stages ?? [], this.grades()),
  );
  protected readonly byGrade = computed(() => gradeHours(this.carving()?.rows ?? [], this.grades()));
  protected readonly total = computed<Explained>(() => ({
    id: 'carving',
    heading: this.formats.figure('hours', this.carving()?.total.likely ?? 0),
    reasons: this.carving()?.reasons ?? [],
  }));
  protected readonly range = computed(() => {
    const total = this.carving()?.total;
    return total ? this.ornamentColumns.between(total) : '';
  });
  protected readonly nameOf = ({ name }: OrnamentSum): string => name;
  protected readonly columns: readonly FigureColumn<OrnamentSum>[] = [
    { key: 'name', heading: $localize`Ornament`, kind: 'text', text: ({ name }) => name },
    {
      key: 'quantity',
      heading: $localize`How many`,
      kind: 'figure',
      text: ({ quantity }) => this.formats.number(quantity, 1),
    },
    {
      key: 'hours',
      heading: $localize`Hours`,
      kind: 'figure',
      text: ({ hours }) => this.formats.number(hours.likely, 1, 1),
    },
    {
      key: 'range',
      heading: $localize`Low to high`,
      kind: 'text',
      text: ({ hours }) => this.ornamentColumns.between(hours),
    },
  ];

  constructor() {
    inject(PlaceExplanation).follow(() => (this.byStage().length > 0 ? this.total() : undefined));
  }
}
