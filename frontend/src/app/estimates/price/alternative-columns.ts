import { Injectable, computed, inject } from '@angular/core';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { EstimateStore } from '../estimate-store';
import { type AlternativeRow, type RowFigure, figureOf } from './alternative-rows';
import { AlternativeTotals } from './alternative-totals';

type Column = FigureColumn<AlternativeRow>;
type Written = (figure: number) => string;

/** The columns in which the base and its alternatives stand beside each other; under each figure, small, the difference to the base. */
@Injectable()
export class AlternativeColumns {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);
  private readonly worked = inject(AlternativeTotals);

  private readonly hasGroups = computed(() =>
    (this.store.settings()?.alternatives ?? []).some(({ group }) => group !== ''),
  );
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
    ...(this.store.seesPrices() ? [this.price()] : []),
  ]);
  readonly all = computed<readonly Column[]>(() => [
    this.name,
    ...(this.hasGroups() ? [this.group()] : []),
    ...this.figures(),
  ]);

  private group(): Column {
    return { key: 'group', heading: $localize`Group`, kind: 'text', text: ({ group }) => group };
  }

  private price(): Column {
    const sign = this.formats.currencySign();
    return this.column('gross_minor', $localize`Gross, ${sign}:sign:`, (amount) => this.formats.amount(amount));
  }

  private column(which: RowFigure, heading: string, write: Written): Column {
    const text = (row: AlternativeRow) => {
      const figure = figureOf(row, which);
      return figure === undefined ? '…' : write(figure);
    };
    return { key: which, heading, kind: 'figure', text, minor: (row) => this.difference(row, which, write) };
  }

  /** Nothing under the base itself; a difference too small to be written is none. */
  private difference(row: AlternativeRow, which: RowFigure, write: Written): string {
    const [own, base] = [figureOf(row, which), figureOf({ total: this.worked.base() }, which)];
    if (row.isBase || own === undefined || base === undefined) return '';
    return write(Math.abs(own - base)) === write(0) ? $localize`as the base` : this.formats.signed(own - base, write);
  }
}
