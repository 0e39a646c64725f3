import { computed, type Signal } from '@angular/core';
import type { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { type AlternativeRow, type RowFigure, figureOf } from './alternative-rows';
import type { BaseTotal } from './alternative-totals';

type Column = FigureColumn<AlternativeRow>;
type Written = (figure: number) => string;

/** Beside what the alternatives stand, and who looks at them. */
interface Shown {
  readonly base: Signal<BaseTotal | undefined>;
  readonly groups: Signal<readonly string[]>;
  readonly seesPrices: Signal<boolean>;
  /** What stands for a figure that is not known. */
  readonly unknown: string;
}

/** The columns in which the base and its alternatives stand beside each other; under each figure, small, the difference to the base. */
export class AlternativeColumns {
  constructor(
    private readonly formats: Formats,
    private readonly shown: Shown,
  ) {}

  readonly name: Column = {
    key: 'name',
    heading: $localize`Alternative`,
    kind: 'text',
    text: ({ name }) => name,
    minor: ({ note }) => note,
  };
  readonly figures = computed<readonly Column[]>(() => [
    this.column('booklets', $localize`Booklets`, (figure) => this.formats.number(figure, 0)),
    this.column('hours', $localize`Hours`, (figure) => this.formats.number(figure, 1, 1)),
    this.column('workingDays', $localize`Working days`, (figure) => this.formats.number(figure, 0)),
    this.column('weeks', $localize`Weeks`, (figure) => this.formats.number(figure, 1, 1)),
    ...(this.shown.seesPrices() ? [this.price()] : []),
  ]);
  readonly all = computed<readonly Column[]>(() => [
    this.name,
    ...(this.shown.groups().some((group) => group !== '') ? [this.group()] : []),
    ...this.figures(),
  ]);

  private group(): Column {
    return { key: 'group', heading: $localize`Group`, kind: 'text', text: ({ group }) => group };
  }

  private price(): Column {
    const sign = this.formats.currencySign();
    return this.column('gross_minor', $localize`Total, ${sign}:sign:`, (amount) => this.formats.amount(amount));
  }

  private column(which: RowFigure, heading: string, write: Written): Column {
    const text = (row: AlternativeRow) => {
      const figure = figureOf(row, which);
      return figure === undefined ? this.shown.unknown : write(figure);
    };
    return { key: which, heading, kind: 'figure', text, minor: (row) => this.difference(row, which, write) };
  }

  /** Nothing under the base itself; a difference too small to be written is none. */
  private difference(row: AlternativeRow, which: RowFigure, write: Written): string {
    const [own, base] = [figureOf(row, which), figureOf({ total: this.shown.base() }, which)];
    if (row.isBase || own === undefined || base === undefined) return '';
    return write(Math.abs(own - base)) === write(0) ? $localize`as the base` : this.formats.signed(own - base, write);
  }
}
