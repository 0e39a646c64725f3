import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardColumn, CardList, CardTable, CellUnit } from '#shared/rate-cards/tables/card-table';
import { words } from '../../platform/http/words';

/** A column of a sheet: an id to find the row by, or a cell of the card. */
export interface SheetColumn {
  readonly heading: string;
  /** Ids come first: those of the items a row stands in, then its own. */
  readonly isId: boolean;
  readonly column?: CardColumn;
}

/** The sheet of a table: its name and its columns in order. */
export interface SheetLayout {
  readonly name: string;
  readonly columns: readonly SheetColumn[];
}

export const nameOf = ({ heading }: CardTable): string => words(heading);

/** The tables whose items a row of a list stands in, outermost first. */
export function tablesAround({ within }: CardList): CardList[] {
  const table = cardTables.find((one): one is CardList => one.kind === 'list' && one.id === within);
  return table ? [...tablesAround(table), table] : [];
}

// A sheet names the unit of any figure there may be, so of several.
const unitWord = (unit: Exclude<CellUnit, 'money'>): string => words(`card-unit-${unit}`, { count: 2 });

const headingOf = ({ heading, unit }: CardColumn, currency: string): string => {
  if (unit === undefined) return words(heading);
  return `${words(heading)} (${unit === 'money' ? currency : unitWord(unit)})`;
};

const id = (heading: string): SheetColumn => ({ heading, isId: true });
const plain = (heading: string): SheetColumn => ({ heading, isId: false });

function leadOf(table: CardTable): SheetColumn[] {
  const own = id(words('card-column-id'));
  switch (table.kind) {
    case 'list': {
      const around = tablesAround(table).map((one) => id(words('card-column-of', { table: nameOf(one) })));
      return table.hasIds ? [...around, own] : around;
    }
    case 'grid':
      return [own, plain(words('card-column-row'))];
    case 'form':
      return [own, plain(words('card-column-figure'))];
  }
}

/** How a table is laid out on its sheet; a form has one column of values, each row with a kind of its own. */
export function sheetLayout(table: CardTable, currency: string): SheetLayout {
  const lead = leadOf(table);
  const cells: SheetColumn[] =
    table.kind === 'form'
      ? [plain(words('card-column-value')), plain(words('card-column-unit'))]
      : table.columns.map((column) => ({ heading: headingOf(column, currency), isId: false, column }));
  return { name: nameOf(table), columns: [...lead, ...cells] };
}

/** The unit of a figure in words; money is in the currency named. */
export const unitText = ({ unit }: CardColumn, currency: string): string => {
  if (unit === undefined) return '';
  return unit === 'money' ? currency : unitWord(unit);
};
