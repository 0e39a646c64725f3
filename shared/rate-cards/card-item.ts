/** An item of a card: anything with an id. */
export interface CardItem {
  readonly id: string;
  readonly [field: string]: unknown;
}

/** Objects and lists, whatever they hold. */
export const isRecord = (value: unknown): value is object => typeof value === 'object' && value !== null;

const isItem = (value: unknown): value is CardItem => isRecord(value) && 'id' in value && typeof value.id === 'string';

/** A list of items alone (an empty list is one too). */
export const isItemList = (value: unknown): value is readonly CardItem[] => Array.isArray(value) && value.every(isItem);

/** The fields of an object or the places of a list, in their order; nothing of anything else. An item's own id is no field that could change. */
export const entriesOf = (value: unknown): Map<string, unknown> =>
  new Map(isRecord(value) ? Object.entries(value).filter(([key]) => key !== 'id') : []);

/** Keys of the first, then those only the second has. */
export const keysOf = (first: ReadonlyMap<string, unknown>, second: ReadonlyMap<string, unknown>): string[] => [
  ...new Set([...first.keys(), ...second.keys()]),
];

/** The items that stand elsewhere among those both lists have, with their places before and after, counted from 1. */
export function moves(before: readonly CardItem[], after: readonly CardItem[]): Map<string, readonly [number, number]> {
  const stayed = before.filter((item) => after.some((one) => one.id === item.id)).map(({ id }) => id);
  const now = after.filter((item) => stayed.includes(item.id)).map(({ id }) => id);
  const moved = now.map((id, at): [string, readonly [number, number]] => [id, [stayed.indexOf(id) + 1, at + 1]]);
  return new Map(moved.filter(([, [was, is]]) => was !== is));
}
