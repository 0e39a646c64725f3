import { entriesOf, isItemList, isRecord, keysOf, moves, type CardItem } from '#shared/rate-cards/card-item';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** A figure, name or choice of a card; null where there is none. */
export type CardValue = string | number | boolean | null;

/** The parts of a card, in the order they are shown. */
export const cardSections = ['measure', 'carving', 'leaf', 'buildUps', 'drying', 'money'] as const;
export type CardSection = (typeof cardSections)[number];

/**
 * One line of difference between two cards. `list` names the list an item stands in ("buildUps/steps"); `itemId` and `itemName` name
 * the item with those it stands in ("water-burnished/gesso"), all empty for a figure of the part itself. `field` is the path below it,
 * empty where an item was added, removed or moved: then the values are its name or its place.
 */
export interface CardDifference {
  readonly kind: 'changed' | 'added' | 'removed' | 'moved';
  readonly section: CardSection;
  readonly list: string;
  readonly itemId: string;
  readonly itemName: string;
  readonly field: string;
  readonly before: CardValue;
  readonly after: CardValue;
}

interface Place {
  readonly section: CardSection;
  readonly lists: readonly string[];
  readonly ids: readonly string[];
  readonly names: readonly string[];
  readonly fields: readonly (string | number)[];
}

const nameOf = (item: CardItem): string => (typeof item['name'] === 'string' ? item['name'] : item.id);

const inItem = (place: Place, item: CardItem): Place => ({
  section: place.section,
  lists: [...place.lists, place.fields.join('.')],
  ids: [...place.ids, item.id],
  names: [...place.names, nameOf(item)],
  fields: [],
});

const inField = (place: Place, key: string | number): Place => ({ ...place, fields: [...place.fields, key] });

function line(place: Place, kind: CardDifference['kind'], values: readonly [CardValue, CardValue]): CardDifference {
  const { section, lists, ids, names, fields } = place;
  return {
    kind,
    section,
    list: lists.join('/'),
    itemId: ids.join('/'),
    itemName: names.join(' · '),
    field: fields.join('.'),
    before: values[0],
    after: values[1],
  };
}

/** Items are matched by their id: those of the later card in its order, then those that went. */
function ofItems(before: readonly CardItem[], after: readonly CardItem[], place: Place): CardDifference[] {
  const moved = moves(before, after);
  const kept = after.flatMap((item) => {
    const old = before.find((one) => one.id === item.id);
    if (!old) return [line(inItem(place, item), 'added', [null, nameOf(item)])];
    const move = moved.get(item.id);
    return [
      ...(move ? [line(inItem(place, item), 'moved', move)] : []),
      ...differences(old, item, inItem(place, item)),
    ];
  });
  const gone = before.filter((item) => !after.some((one) => one.id === item.id));
  return [...kept, ...gone.map((item) => line(inItem(place, item), 'removed', [nameOf(item), null]))];
}

const valueOf = (value: unknown): CardValue =>
  typeof value === 'string' || typeof value === 'number' || typeof value === 'boolean' ? value : null;

function differences(before: unknown, after: unknown, place: Place): CardDifference[] {
  if (isItemList(before) && isItemList(after) && before.length + after.length > 0) return ofItems(before, after, place);
  if (isRecord(before) || isRecord(after)) {
    const [old, next] = [entriesOf(before), entriesOf(after)];
    const inside = keysOf(next, old).flatMap((key) => differences(old.get(key), next.get(key), inField(place, key)));
    const [one, other] = [isRecord(before) ? null : valueOf(before), isRecord(after) ? null : valueOf(after)];
    return one === other ? inside : [line(place, 'changed', [one, other]), ...inside];
  }
  const values = [valueOf(before), valueOf(after)] as const;
  return values[0] === values[1] ? [] : [line(place, 'changed', values)];
}

/** A part as it is compared: in which currency prices are meant is kept by the program, and nobody's change. */
function compared(card: RateCard, section: CardSection): unknown {
  if (section !== 'money') return card[section];
  const { currency: _kept, ...money } = card.money;
  return money;
}

/**
 * Every difference between two cards, part by part and in the order of the later card: one line for each figure changed, and for each item added,
 * removed or moved. Items are matched by id, so a renamed one is a change of its name.
 */
export const cardDifferences = (before: RateCard, after: RateCard): CardDifference[] =>
  cardSections.flatMap((section) =>
    differences(compared(before, section), compared(after, section), {
      section,
      lists: [],
      ids: [],
      names: [],
      fields: [],
    }),
  );
