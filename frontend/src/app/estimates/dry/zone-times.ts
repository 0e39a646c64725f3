import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { smallScreen } from '../../ui/screen/small-screen';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import type { ShownLot } from './dry-lots';
import { timeColumns } from './time-columns';

/** A zone with the hands it takes, and how long its lot waits. */
interface ZoneTime {
  readonly id: string;
  readonly name: string;
  readonly lot: string;
  readonly handsOn_hours: number;
  readonly waiting_minutes: number;
}

/** Every zone with its own hands-on time, without what a lot is set up for, and the waiting of the lot it is coated with. */
@Component({
  selector: 'app-zone-times',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      captionShown
      i18n-caption
      caption="Zones, without setting up, each with the waiting of its lot"
      [columns]="columns()"
      [rows]="rows()"
      [rowId]="idOf"
      [totals]="totals()"
    />
  `,
})
export class ZoneTimes {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);

  private readonly isSmall = smallScreen();

  readonly lots = input.required<readonly ShownLot[]>();

  protected readonly idOf = ({ id }: ZoneTime): string => id;
  protected readonly rows = computed<readonly ZoneTime[]>(() => {
    const hours = new Map(this.store.figures()?.zones.map(({ zoneId, hours: { likely } }) => [zoneId, likely]));
    return this.lots().flatMap(({ name: lot, zones, waiting_minutes }) =>
      zones.map(({ member, zone }) => ({
        ...{ id: zone.id, name: `${member.name}, ${zone.name}`, lot, waiting_minutes },
        handsOn_hours: hours.get(zone.id) ?? 0,
      })),
    );
  });
  protected readonly columns = computed<readonly FigureColumn<ZoneTime>[]>(() => [
    { key: 'name', heading: $localize`Zone`, kind: 'text', text: ({ name }) => name },
    ...(this.isSmall() ? [] : [this.lot()]),
    ...timeColumns<ZoneTime>(
      this.formats,
      ({ handsOn_hours }) => this.hours(handsOn_hours),
      ({ waiting_minutes }) => waiting_minutes,
    ),
  ]);
  protected readonly totals = computed((): Readonly<Record<string, string>> => {
    const hours = this.rows().reduce((sum, { handsOn_hours }) => sum + handsOn_hours, 0);
    return { name: $localize`Together`, handsOn: this.hours(hours) };
  });

  private lot(): FigureColumn<ZoneTime> {
    return { key: 'lot', heading: $localize`Lot`, kind: 'text', text: ({ lot }) => lot };
  }

  private hours(hours: number): string {
    return $localize`${this.formats.number(hours, 1, 1)}:hours: h`;
  }
}
