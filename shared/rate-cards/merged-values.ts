import { isItemList, isRecord, type CardItem } from '#shared/rate-cards/card-item';

/** Whose value stands where both changed the same line. */
export type CardSide = 'mine' | 'theirs';

/** A line both sides changed, each in its own way; `key` is its place by fields and ids ("money/grades/gilder/costPerHour"). */
export interface MergeOverlap {
  readonly key: string;
}

/** What two people made of one thing they both began with. */
export interface ThreeValues {
  readonly base: unknown;
  readonly mine: unknown;
  readonly theirs: unknown;
}

type SideOf = (key: string) => CardSide;

interface Merging {
  readonly sideOf: SideOf;
  readonly overlaps: MergeOverlap[];
}

/** Where one of these is another, the fields beside it mean something else: such a record is one line. */
const wayFields = ['way', 'of', 'kind', 'role', 'form'] as const;

const fieldsOf = (value: unknown): Readonly<Record<string, unknown>> =>
  isRecord(value) ? (value as Readonly<Record<string, unknown>>) : {};

function isSame(one: unknown, other: unknown): boolean {
  if (!isRecord(one) || !isRecord(other)) return one === other;
  if (Array.isArray(one) !== Array.isArray(other)) return false;
  const [first, second] = [fieldsOf(one), fieldsOf(other)];
  return [...new Set([...Object.keys(first), ...Object.keys(second)])].every((key) => isSame(first[key], second[key]));
}

const goesAnotherWay = ({ base, mine, theirs }: ThreeValues): boolean =>
  wayFields.some((field) => {
    const before = fieldsOf(base)[field];
    return before !== undefined && (fieldsOf(mine)[field] !== before || fieldsOf(theirs)[field] !== before);
  });

const isPlain = (value: unknown): boolean => isRecord(value) && !Array.isArray(value);

/** Both changed it: what stands is chosen. */
function chosen({ mine, theirs }: ThreeValues, key: string, { sideOf, overlaps }: Merging): unknown {
  overlaps.push({ key });
  return sideOf(key) === 'mine' ? mine : theirs;
}

function mergedFields(values: ThreeValues, key: string, merging: Merging): Record<string, unknown> {
  const [base, mine, theirs] = [fieldsOf(values.base), fieldsOf(values.mine), fieldsOf(values.theirs)];
  const names = [...new Set([...Object.keys(mine), ...Object.keys(theirs)])];
  const fields = names.map((name): [string, unknown] => {
    const three = { base: base[name], mine: mine[name], theirs: theirs[name] };
    return [name, merged(three, key === '' ? name : `${key}/${name}`, merging)];
  });
  return Object.fromEntries(fields.filter(([, value]) => value !== undefined));
}

/** The items both sides still have, in the order of one of them. */
const inOrderOf = (list: readonly CardItem[], others: readonly CardItem[]): string[] =>
  list.filter(({ id }) => others.some((one) => one.id === id)).map(({ id }) => id);

const isMoved = (base: readonly CardItem[], list: readonly CardItem[]): boolean =>
  inOrderOf(base, list).join(' ') !== inOrderOf(list, base).join(' ');

interface ThreeLists {
  readonly base: readonly CardItem[];
  readonly mine: readonly CardItem[];
  readonly theirs: readonly CardItem[];
}

/** All ids of both sides: in the order of whoever moved something, what the other has besides after its neighbour there. */
function idsInOrder({ base, mine, theirs }: ThreeLists, key: string, merging: Merging): string[] {
  const [mineMoved, theirsMoved] = [isMoved(base, mine), isMoved(base, theirs)];
  const isOneOrder = inOrderOf(mine, theirs).join(' ') === inOrderOf(theirs, mine).join(' ');
  const isMineFirst =
    mineMoved && theirsMoved && !isOneOrder
      ? chosen({ base: false, mine: true, theirs: false }, `${key}/*`, merging) === true
      : mineMoved;
  const [lead, other] = isMineFirst ? [mine, theirs] : [theirs, mine];
  const ids = lead.map(({ id }) => id);
  other.forEach(({ id }, at) => {
    const before = other[at - 1]?.id;
    if (!ids.includes(id)) ids.splice(before === undefined ? 0 : ids.indexOf(before) + 1, 0, id);
  });
  return ids;
}

function mergedItems(lists: ThreeLists, key: string, merging: Merging): unknown[] {
  const of = (list: readonly CardItem[], id: string) => list.find((one) => one.id === id);
  return idsInOrder(lists, key, merging)
    .map((id) => {
      const { base, mine, theirs } = lists;
      return merged({ base: of(base, id), mine: of(mine, id), theirs: of(theirs, id) }, `${key}/${id}`, merging);
    })
    .filter((item) => item !== undefined);
}

function merged(values: ThreeValues, key: string, merging: Merging): unknown {
  const { base, mine, theirs } = values;
  if (isSame(mine, theirs) || isSame(theirs, base)) return mine;
  if (isSame(mine, base)) return theirs;
  if (isItemList(mine) && isItemList(theirs))
    return mergedItems({ base: isItemList(base) ? base : [], mine, theirs }, key, merging);
  if (isPlain(mine) && isPlain(theirs) && !goesAnotherWay(values)) return mergedFields(values, key, merging);
  return chosen(values, key, merging);
}

/** What two people made of one thing, laid together line by line, and the lines both changed, which `sideOf` decides. Items are matched by id. */
export function mergedValues<Value>(
  values: { readonly base: Value; readonly mine: Value; readonly theirs: Value },
  sideOf: SideOf,
): { readonly value: Value; readonly overlaps: readonly MergeOverlap[] } {
  const overlaps: MergeOverlap[] = [];
  return { value: merged(values, '', { sideOf, overlaps }) as Value, overlaps };
}
