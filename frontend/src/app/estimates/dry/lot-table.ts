import { ChangeDetectionStrategy, Component, computed, inject, input, model } from '@angular/core';
import { dayOf } from '#shared/drying/day-length-minutes';
import { Formats } from '../../core/formats/formats';
import type { WorkedLot } from '../../drying';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';

/** The lots with their hands-on and waiting time, and on which days they are in work. */
@Component({
  selector: 'app-lot-table',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      captionShown
      i18n-caption
      caption="Lots"
      selectable
      [columns]="columns"
      [rows]="lots()"
      [rowId]="idOf"
      [totals]="totals()"
      [(chosen)]="chosen"
    />
  `,
})
export class LotTable {
  private readonly formats = inject(Formats);

  readonly lots = input.required<readonly WorkedLot[]>();
  readonly chosen = model<string>();

  protected readonly idOf = ({ lotId }: WorkedLot): string => lotId;
  protected readonly columns: readonly FigureColumn<WorkedLot>[] = [
    { key: 'name', heading: $localize`Coated together`, kind: 'text', text: ({ name }) => name },
    {
      key: 'handsOn',
      heading: $localize`Hands on`,
      kind: 'figure',
      text: ({ handsOn_minutes }) => this.hours(handsOn_minutes),
    },
    {
      key: 'waiting',
      heading: $localize`Waiting`,
      kind: 'figure',
      text: ({ waiting_minutes }) => this.formats.figure('minutes', waiting_minutes),
    },
    { key: 'days', heading: $localize`In work`, kind: 'text', text: (lot) => this.days(lot) },
  ];
  protected readonly totals = computed(() => {
    const minutes = this.lots().reduce((sum, { handsOn_minutes }) => sum + handsOn_minutes, 0);
    return { name: $localize`Together`, handsOn: this.hours(minutes) };
  });

  private hours(minutes: number): string {
    return $localize`${this.formats.number(minutes / 60, 1, 1)}:hours: h`;
  }

  private days({ start_minutes, end_minutes }: WorkedLot): string {
    const [first, last] = [start_minutes, Math.max(start_minutes, end_minutes - 1)].map((at_minutes) =>
      this.formats.number(dayOf(at_minutes) + 1, 0),
    );
    return $localize`day ${first}:day: to ${last}:lastDay:`;
  }
}
