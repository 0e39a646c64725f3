import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { tripleSum } from '#shared/units/triple-sum';
import { Formats } from '../core/formats/formats';
import type { Explained } from '../ui/figure/explained';
import type { FigureColumn } from '../ui/table/figure-column';
import { smallScreen } from '../ui/screen/small-screen';
import { FigureTable } from '../ui/table/figure-table';
import type { NamedHours } from './stage-hours';

/** Hours under their names, likely and from low to high, with their sum. */
@Component({
  selector: 'app-hours-table',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      captionShown
      [caption]="caption()"
      [columns]="columns()"
      [rows]="rows()"
      [rowId]="idOf"
      [totals]="totals()"
    />
  `,
})
export class HoursTable {
  private readonly formats = inject(Formats);
  private readonly isSmall = smallScreen();

  readonly caption = input.required<string>();
  readonly rows = input.required<readonly NamedHours[]>();
  /** How a row came about, by its id. */
  readonly explained = input<(row: NamedHours) => Explained | undefined>(() => undefined);
  readonly showsGrade = input(true);

  protected readonly idOf = (row: NamedHours) => row.id;
  protected readonly columns = computed<readonly FigureColumn<NamedHours>[]>(() => [
    {
      key: 'name',
      heading: this.showsGrade() ? $localize`Work` : $localize`Grade`,
      kind: 'text',
      text: ({ name }) => name,
      // On a phone there is no room for a column of grades.
      ...(this.isSmall() && this.showsGrade() ? { minor: ({ grade }: NamedHours) => grade } : {}),
    },
    ...(this.showsGrade() && !this.isSmall()
      ? [{ key: 'grade', heading: $localize`Grade`, kind: 'text', text: (row: NamedHours) => row.grade } as const]
      : []),
    {
      key: 'hours',
      heading: $localize`Hours`,
      kind: 'figure',
      text: (row) => this.likely(row),
      explained: this.explained(),
    },
    { key: 'range', heading: $localize`Low to high`, kind: 'figure', text: (row) => this.range(row) },
  ]);
  protected readonly totals = computed(() => {
    const hours = tripleSum(this.rows().map((row) => row.hours));
    return { name: $localize`Together`, hours: this.likely({ hours }), range: this.range({ hours }) };
  });

  private likely({ hours }: Pick<NamedHours, 'hours'>): string {
    return this.formats.number(hours.likely, 1, 1);
  }

  private range({ hours }: Pick<NamedHours, 'hours'>): string {
    const [low, high] = [hours.low, hours.high].map((figure) => this.formats.number(figure, 1, 1));
    return low === high ? low : $localize`${low}:low: to ${high}:high:`;
  }
}
