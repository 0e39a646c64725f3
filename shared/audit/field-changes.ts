/** A value that stands by itself in what was entered. */
export type FieldValue = string | number | boolean | null;

/**
 * One field in which two versions of a thing differ. The path names each level; an item of a list stands there under its own name, or
 * under its number where it has none. An item that came or went is one change without values, and so is a list in another order.
 */
export interface FieldChange {
  readonly path: readonly string[];
  readonly what: 'changed' | 'added' | 'removed' | 'moved';
  readonly before: FieldValue;
  readonly after: FieldValue;
}

type Fields = Readonly<Record<string, unknown>>;
type Item = Fields & { readonly id: string };
type Path = readonly string[];

const isFields = (value: unknown): value is Fields =>
  typeof value === 'object' && value !== null && !Array.isArray(value);
const isItem = (value: unknown): value is Item => isFields(value) && typeof value['id'] === 'string';
const isItems = (value: unknown): value is readonly Item[] => Array.isArray(value) && value.every(isItem);

/** Marks of the program itself, which tell a person nothing. */
const unspoken: ReadonlySet<string> = new Set(['id', 'typed', 'version']);

const whole = (path: Path, what: FieldChange['what']): FieldChange => ({ path, what, before: null, after: null });
const fieldValue = (value: unknown): FieldValue =>
  typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean' ? value : null;

function nameOf(item: Item, number: number): string {
  const name = item['name'] ?? item['ornamentId'] ?? item['element'];
  return typeof name === 'string' && name !== '' ? name : String(number);
}

/** The names of everything in a thing that has an id, so that a field which points at it can be read. */
function namesIn(value: unknown, into: Map<string, string>): Map<string, string> {
  if (isItem(value)) into.set(value.id, nameOf(value, 0));
  if (typeof value === 'object' && value !== null) Object.values(value).forEach((inner) => namesIn(inner, into));
  return into;
}

const isMark = (value: unknown): boolean => typeof value === 'string' && /^[0-9a-f]{8}-[0-9a-f-]{27}$/.test(value);

class Comparison {
  private readonly names: ReadonlyMap<string, string>;

  constructor(before: unknown, after: unknown) {
    this.names = namesIn(after, namesIn(before, new Map()));
  }

  between(before: unknown, after: unknown, path: Path): FieldChange[] {
    if (isItems(before) && isItems(after) && before.length + after.length > 0) return this.items(before, after, path);
    if (Array.isArray(before) && Array.isArray(after)) return this.fields({ ...before }, { ...after }, path);
    const [was, is] = [before ?? {}, after ?? {}];
    if (isFields(was) && isFields(is) && (isFields(before) || isFields(after))) return this.fields(was, is, path);
    return this.values(before, after, path);
  }

  private fields(before: Fields, after: Fields, path: Path): FieldChange[] {
    const keys = [...new Set([...Object.keys(before), ...Object.keys(after)])].filter((key) => !unspoken.has(key));
    return keys.flatMap((key) => {
      // Items of a list without ids are told by their number.
      const part = /^\d+$/.test(key) ? String(Number(key) + 1) : key;
      return this.between(before[key], after[key], [...path, part]);
    });
  }

  private items(before: readonly Item[], after: readonly Item[], path: Path): FieldChange[] {
    const kept = before.filter(({ id }) => after.some((item) => item.id === id));
    const order = after.filter(({ id }) => before.some((item) => item.id === id));
    const isMoved = order.some((item, index) => kept[index].id !== item.id);
    const changed = order.flatMap((item) => {
      const earlier = before.find(({ id }) => id === item.id);
      return this.between(earlier, item, [...path, nameOf(item, after.indexOf(item) + 1)]);
    });
    const gone = before.filter(({ id }) => !after.some((item) => item.id === id));
    const come = after.filter(({ id }) => !before.some((item) => item.id === id));
    return [
      ...gone.map((item) => whole([...path, nameOf(item, before.indexOf(item) + 1)], 'removed')),
      ...come.map((item) => whole([...path, nameOf(item, after.indexOf(item) + 1)], 'added')),
      ...(isMoved ? [whole(path, 'moved')] : []),
      ...changed,
    ];
  }

  private values(before: unknown, after: unknown, path: Path): FieldChange[] {
    if (JSON.stringify(before) === JSON.stringify(after)) return [];
    const isPlace = path.at(-1) === 'place' && typeof before === 'number' && typeof after === 'number';
    if (isPlace) return [whole(path, 'moved')];
    if (Array.isArray(before ?? after)) {
      if (before === undefined || before === null) return [whole(path, 'added')];
      return [whole(path, after === undefined || after === null ? 'removed' : 'changed')];
    }
    return [{ path, what: 'changed', before: this.said(before), after: this.said(after) }];
  }

  /** Where a field points at another thing, the name of that; nothing where it is not known. */
  private said(value: unknown): FieldValue {
    return isMark(value) ? (this.names.get(String(value)) ?? null) : fieldValue(value);
  }
}

/**
 * The fields in which two versions of one thing differ, in the order they were entered; nothing where one of the two is missing: what was
 * made or removed has no changes. Units by the names of the fields, as everywhere; lists of things with ids are matched by these.
 */
export function fieldChanges(before: unknown, after: unknown): FieldChange[] {
  if (!isFields(before) || !isFields(after)) return [];
  return new Comparison(before, after).between(before, after, []);
}
