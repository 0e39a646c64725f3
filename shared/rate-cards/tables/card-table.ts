import type { WordCode } from '#shared/words/word-code';

/** What a cell holds. `decimal` is an exact decimal as text, `hundredths` a share kept in hundredths of a percent and shown in percent. */
export type CellKind = 'text' | 'number' | 'decimal' | 'hundredths' | 'yes-no' | 'choice' | 'choices' | 'item';

/** Money is in the workshop's currency. */
export type CellUnit =
  | 'money'
  | 'mm'
  | 'hours'
  | 'minutes'
  | 'days'
  | 'working-days'
  | 'percent'
  | 'grams'
  | 'micrometres'
  | 'kilograms'
  | 'density'
  | 'newtons'
  | 'celsius'
  | 'parts';

/** One thing that may be chosen, with its word. */
export interface CardChoice {
  readonly value: string;
  readonly word: WordCode;
}

/** A list of the card whose items a cell may name. */
export type ItemList = 'grade' | 'leaf' | 'timber' | 'material' | 'material-or-recipe' | 'later-step' | 'tax';

/** What stands where nothing is entered: null, or no field at all; without it something has to be entered (a text may be empty). */
export type EmptyCell = 'null' | 'absent';

/** One kind of cell. `field` is the way to its value, parts joined by dots: below the row in a list, from the card down in a grid or form. */
export interface CardColumn {
  readonly field: string;
  readonly kind: CellKind;
  readonly heading: WordCode;
  readonly unit?: CellUnit;
  readonly choices?: readonly CardChoice[];
  readonly items?: ItemList;
  readonly empty?: EmptyCell;
}

interface Named {
  readonly id: string;
  readonly heading: WordCode;
  readonly columns: readonly CardColumn[];
}

/** Items of a list, or lines that have no id. In `place` a star stands for each item of the list before it ("leaf.products.*.breaks"). */
export interface CardList extends Named {
  readonly kind: 'list';
  readonly place: string;
  readonly hasIds: boolean;
  /** The table of the items it stands in. */
  readonly within?: string;
}

/** A row of a grid: what stands for the star of its columns, and what it is called. */
export interface GridRow {
  readonly key: string;
  readonly words: readonly WordCode[];
}

/** The same figures for each of a fixed set of things. */
export interface CardGrid extends Named {
  readonly kind: 'grid';
  readonly rows: readonly GridRow[];
}

/** Single figures, one under the other. */
export interface CardForm extends Named {
  readonly kind: 'form';
}

export type CardTable = CardList | CardGrid | CardForm;

/** A part of the card as it is shown: not as it is kept, but as it is thought of. */
export interface CardPart {
  readonly id: string;
  readonly heading: WordCode;
  readonly tables: readonly CardTable[];
}
