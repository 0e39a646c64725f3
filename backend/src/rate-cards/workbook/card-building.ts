import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardList, CardTable } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, type CellPath } from '#shared/rate-cards/tables/cell-path';
import type { Complaint } from '#shared/problems/complaint';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** A cell, or a whole row or sheet, as the person who filled it in finds it: sheet, row, column letter. */
export type SheetPlace = readonly (string | number)[];

type Fields = Record<string | number, unknown>;

const isList = (table: CardTable): table is CardList => table.kind === 'list';
const keyOf = (path: CellPath): string => path.join('\n');

/** The lists that stand directly in each item of a table, by their way from the item; without a table, those of the card itself. */
const listsIn = (within: string | undefined): readonly CellPath[] =>
  cardTables.filter(isList).flatMap((table) => {
    if (table.within !== within) return [];
    return [fieldsOf(table.place.split('.*.').at(-1) ?? '')];
  });

/** A card put together cell by cell, with the place each part of it came from. */
export class CardBuilding {
  readonly card: Fields = {};
  readonly complaints: Complaint[] = [];
  private readonly places = new Map<string, SheetPlace>();
  private readonly items = new Map<string, CellPath>();

  constructor() {
    for (const place of listsIn(undefined)) this.write(place, []);
  }

  complain(place: SheetPlace, code: WordCode, values: WordValues = {}): void {
    this.complaints.push({ path: place, code, values });
  }

  /** Says where a part of the card comes from that is no cell. */
  mark(path: CellPath, from: SheetPlace): void {
    this.places.set(keyOf(path), from);
  }

  /** Puts a value in its place; undefined leaves no field. */
  put(path: CellPath, value: unknown, from: SheetPlace): void {
    this.places.set(keyOf(path), from);
    if (value !== undefined) this.write(path, value);
  }

  /** Begins an item at the end of a list, with its own lists empty; answers the way to it. */
  begin(table: CardList, list: CellPath, from: SheetPlace): CellPath {
    const items = this.read(list) as unknown[];
    const path = [...list, items.length];
    items.push({});
    this.places.set(keyOf(path), from);
    for (const inner of listsIn(table.id)) this.write([...path, ...inner], []);
    return path;
  }

  /** Remembers an item by the ids it stands under, for the rows that belong to it. */
  know(table: CardList, ids: readonly string[], path: CellPath): void {
    const key = keyOf([table.id, ...ids]);
    if (!this.items.has(key)) this.items.set(key, path);
  }

  itemOf(table: CardList, ids: readonly string[]): CellPath | undefined {
    return this.items.get(keyOf([table.id, ...ids]));
  }

  /** Where a part of the card came from, or else what it stands in. */
  placeOf(path: CellPath): SheetPlace {
    for (let length = path.length; length > 0; length--) {
      const place = this.places.get(keyOf(path.slice(0, length)));
      if (place) return place;
    }
    return [];
  }

  private read(path: CellPath): unknown {
    return path.reduce<unknown>((at, part) => (at as Fields)[part], this.card);
  }

  private write(path: CellPath, value: unknown): void {
    let at: Fields = this.card;
    for (const part of path.slice(0, -1)) at = (at[part] ??= {}) as Fields;
    at[path.at(-1) as string] = value;
  }
}
