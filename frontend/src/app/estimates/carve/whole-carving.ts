import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { gradeHours, HoursTable, stageHours } from '../../carving';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';
import { EmptyState } from '../../ui/page/empty-state';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { explainedBy } from '../places/explained-by';
import { PlaceExplanation } from '../places/place-explanation';
import { OrnamentColumns } from './ornament-columns';
import { type OrnamentSum, ornamentSums } from './ornament-sums';

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
          <app-figure class="sum" [text]="total().heading" [explained]="total()" />&ngsp;
          <span class="muted">{{ range() }}</span>
        </p>
      </header>
      <h3 i18n>By ornament</h3>
      <app-figure-table i18n-caption caption="By ornament" [columns]="columns" [rows]="sums()" [rowId]="nameOf" />
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
  protected readonly sums = computed(() => ornamentSums(this.store.figures()?.uses ?? [], this.store.members()));
  protected readonly byStage = computed(() =>
    stageHours(this.carving()?.rows ?? [], this.carving()?.stages ?? [], this.grades()),
  );
  protected readonly byGrade = computed(() => gradeHours(this.carving()?.rows ?? [], this.grades()));
  protected readonly total = computed<Explained>(() => {
    const { total, reasons = [] } = this.carving() ?? {};
    const heading = this.formats.figure('hours', total?.likely ?? 0);
    return explainedBy({ id: 'carving', heading, reasons }, this.ornamentColumns);
  });
  protected readonly range = computed(() => {
    const total = this.carving()?.total;
    return total ? this.ornamentColumns.between(total) : '';
  });
  protected readonly nameOf = ({ name }: OrnamentSum): string => name;
  protected readonly columns: readonly FigureColumn<OrnamentSum>[] = [
    { key: 'name', heading: $localize`Ornament`, kind: 'text', text: ({ name }) => name },
    {
      key: 'quantity',
      heading: $localize`How much`,
      kind: 'figure',
      text: (sum) => this.amount(sum),
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
      kind: 'figure',
      text: ({ hours }) => this.ornamentColumns.between(hours),
    },
  ];

  private amount({ pieces, run_mm, area_mm2 }: OrnamentSum): string {
    return [
      pieces > 0 ? this.formats.number(pieces, 0) : '',
      run_mm > 0 ? this.formats.length(run_mm) : '',
      area_mm2 > 0 ? this.formats.area(area_mm2) : '',
    ]
      .filter(Boolean)
      .join(' + ');
  }

  constructor() {
    inject(PlaceExplanation).follow(() => (this.byStage().length > 0 ? this.total() : undefined));
  }
}
