import { ChangeDetectionStrategy, Component, computed, inject, input, model } from '@angular/core';
import { dayOf } from '#shared/drying/day-length-minutes';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { smallScreen } from '../../ui/screen/small-screen';
import type { ShownLot } from './dry-lots';
import { timeColumns } from './time-columns';
import { waitingText } from './waiting-text';

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
      [columns]="columns()"
      [rows]="lots()"
      [rowId]="idOf"
      [totals]="totals()"
      [(chosen)]="chosen"
    />
  `,
})
export class LotTable {
  private readonly formats = inject(Formats);
  private readonly isSmall = smallScreen();

  readonly lots = input.required<readonly ShownLot[]>();
  readonly chosen = model<string>();

  protected readonly idOf = ({ lotId }: ShownLot): string => lotId;
  protected readonly columns = computed<readonly FigureColumn<ShownLot>[]>(() => {
    const name: FigureColumn<ShownLot> = {
      key: 'name',
      heading: $localize`Coated together`,
      kind: 'text',
      text: (lot) => lot.name,
      minor: (lot) => [...(this.isSmall() ? [this.small(lot)] : []), lot.members].join('; '),
    };
    return [name, ...(this.isSmall() ? [] : this.times()), this.inWork()];
  });
  protected readonly totals = computed((): Readonly<Record<string, string>> => {
    const minutes = this.lots().reduce((sum, { handsOn_minutes }) => sum + handsOn_minutes, 0);
    const [name, handsOn] = [$localize`Together`, this.hours(minutes)];
    if (!this.isSmall()) return { name, handsOn };
    return { name: $localize`${name}:together: ${handsOn}:hours: hands on` };
  });

  private times(): FigureColumn<ShownLot>[] {
    return timeColumns<ShownLot>(
      this.formats,
      ({ handsOn_minutes }) => this.hours(handsOn_minutes),
      ({ waiting_minutes }) => waiting_minutes,
    );
  }

  private inWork(): FigureColumn<ShownLot> {
    return { key: 'days', heading: $localize`In work`, kind: 'text', text: (lot) => this.days(lot) };
  }

  /** What the columns of a phone leave out. */
  private small({ handsOn_minutes, waiting_minutes }: ShownLot): string {
    const [handsOn, waiting] = [this.hours(handsOn_minutes), waitingText(this.formats, waiting_minutes)];
    return $localize`${handsOn}:hours: hands on, ${waiting}:time: waiting`;
  }

  private hours(minutes: number): string {
    return $localize`${this.formats.number(minutes / 60, 1, 1)}:hours: h`;
  }

  private days({ start_minutes, end_minutes }: ShownLot): string {
    const [first, last] = [start_minutes, Math.max(start_minutes, end_minutes - 1)].map((at_minutes) =>
      this.formats.number(dayOf(at_minutes) + 1, 0),
    );
    return $localize`day ${first}:day: to ${last}:lastDay:`.replaceAll(' ', '\u00a0');
  }
}
