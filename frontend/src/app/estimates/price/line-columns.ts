import type { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import type { LineRow, RowCost } from './line-rows';

type Column = FigureColumn<LineRow>;

/** What of the table is shown: the cost side, or on a small screen only what a line comes to. */
export interface LineColumnsShown {
  readonly withCost: boolean;
  readonly isSmall: boolean;
}

function costColumn(key: keyof RowCost, heading: string, formats: Formats): Column {
  // Goods have no hours; a nought would look worked.
  const hours = (hours: number) => (hours === 0 ? '' : formats.number(hours, 1, 1));
  const write = key === 'hours' ? hours : (minor: number) => formats.amount(minor);
  return { key, heading, kind: 'figure', text: ({ cost }) => (cost ? write(cost[key]) : '') };
}

function costColumns(formats: Formats): Column[] {
  return [
    costColumn('hours', $localize`Hours`, formats),
    costColumn('direct_minor', $localize`Direct`, formats),
    costColumn('overhead_minor', $localize`Overhead`, formats),
    costColumn('contingency_minor', $localize`Contingency`, formats),
    costColumn('cost_minor', $localize`Cost`, formats),
  ];
}

/** The columns of the lines; a price explains itself by its steps where the reader may see them. */
export function lineColumns(formats: Formats, { withCost, isSmall }: LineColumnsShown): Column[] {
  const price: Column = {
    key: 'price_minor',
    heading: $localize`Price, ${formats.currencySign()}:sign:`,
    kind: 'figure',
    text: (row) => formats.amount(row.price_minor),
    explained: ({ id, price_minor, reasons }) =>
      reasons.length > 0 ? { id: `price ${id}`, heading: formats.money(price_minor), reasons } : undefined,
  };
  const name: Column = { key: 'name', heading: $localize`Line`, kind: 'text', text: ({ name }) => name };
  return [name, ...(withCost && !isSmall ? costColumns(formats) : []), price];
}
