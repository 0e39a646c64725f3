import type { CardColumn, CardChoice, CellUnit, EmptyCell, ItemList } from '#shared/rate-cards/tables/card-table';
import type { WordCode } from '#shared/words/word-code';

/** `card-column-` and the rest of a heading's code. */
type Heading = WordCode extends infer Code ? (Code extends `card-column-${infer Rest}` ? Rest : never) : never;

interface More {
  readonly unit?: CellUnit;
  readonly empty?: EmptyCell;
}

const column = (field: string, heading: Heading, rest: Omit<CardColumn, 'field' | 'heading'>): CardColumn => ({
  field,
  heading: `card-column-${heading}` as const,
  ...rest,
});

/** A plain number, in the unit named. */
export const numberColumn = (field: string, heading: Heading, more: More = {}): CardColumn =>
  column(field, heading, { kind: 'number', ...more });

/** An exact decimal, in the unit named. */
export const decimalColumn = (field: string, heading: Heading, more: More = {}): CardColumn =>
  column(field, heading, { kind: 'decimal', ...more });

/** A share kept in hundredths of a percent. */
export const hundredthsColumn = (field: string, heading: Heading): CardColumn =>
  column(field, heading, { kind: 'hundredths', unit: 'percent' });

/** Text of one line, which may be left empty. */
export const textColumn = (field: string, heading: Heading): CardColumn => column(field, heading, { kind: 'text' });

/** Yes or no, kept as true or false. */
export const yesNoColumn = (field: string, heading: Heading): CardColumn => column(field, heading, { kind: 'yes-no' });

/** One of a set, or several of it. */
export const choiceColumn = (
  field: string,
  heading: Heading,
  how: { readonly choices: readonly CardChoice[]; readonly several?: boolean; readonly empty?: EmptyCell },
): CardColumn => {
  const { choices, several = false, empty } = how;
  return column(field, heading, {
    kind: several ? 'choices' : 'choice',
    choices,
    ...(empty === undefined ? {} : { empty }),
  });
};

/** An item of another list of the card. */
export const itemColumn = (
  field: string,
  heading: Heading,
  how: { readonly items: ItemList; readonly empty?: EmptyCell },
): CardColumn => column(field, heading, { kind: 'item', ...how });

export const nameColumn = textColumn('name', 'name');
export const noteColumn = textColumn('note', 'note');
/** A grade of labour of the card. */
export const gradeColumn = (field = 'gradeId'): CardColumn => itemColumn(field, 'grade', { items: 'grade' });
