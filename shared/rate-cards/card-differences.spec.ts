import * as fc from 'fast-check';
import { cardDifferences, type CardDifference } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';

type Loose = Record<string, unknown>;

const copy = (): RateCard => JSON.parse(JSON.stringify(startCard)) as RateCard;

/** Every figure, text and choice of a card with the way to it. */
function leaves(value: unknown, path: readonly string[] = []): (readonly string[])[] {
  if (typeof value !== 'object' || value === null) return path[path.length - 1] === 'id' ? [] : [path];
  return Object.entries(value).flatMap(([key, inner]) => leaves(inner, [...path, key]));
}

function changed(path: readonly string[]): RateCard {
  const card = copy();
  let at = card as unknown as Loose;
  for (const key of path.slice(0, -1)) at = at[key] as Loose;
  const last = path[path.length - 1] ?? '';
  const old = at[last];
  at[last] = typeof old === 'number' ? old + 1 : typeof old === 'boolean' ? !old : `${String(old)} otherwise`;
  return card;
}

const withMoney = (money: Partial<RateCard['money']>): RateCard => ({
  ...startCard,
  money: { ...startCard.money, ...money },
});
const withBuildUps = (buildUps: Partial<RateCard['buildUps']>): RateCard => ({
  ...startCard,
  buildUps: { ...startCard.buildUps, ...buildUps },
});
const grades = startCard.money.grades;

describe('differences between two rate cards', () => {
  it('are none between a card and its copy', () => {
    expect(cardDifferences(startCard, copy())).toEqual([]);
  });

  it.each<[string, RateCard, Partial<CardDifference>]>([
    [
      'a rate of pay',
      withMoney({
        grades: grades.map((grade) => (grade.id === 'gilder' ? { ...grade, costPerHour: '34.00' } : grade)),
      }),
      {
        kind: 'changed',
        section: 'money',
        list: 'grades',
        itemId: 'gilder',
        itemName: 'Gilder',
        field: 'costPerHour',
        before: '33.00',
        after: '34.00',
      },
    ],
    [
      'a figure of a part itself',
      withBuildUps({ setUp_hours: 0.5 }),
      {
        kind: 'changed',
        section: 'buildUps',
        list: '',
        itemId: '',
        itemName: '',
        field: 'setUp_hours',
        before: 0.4,
        after: 0.5,
      },
    ],
    [
      'an item added',
      withMoney({ grades: [...grades, { id: 'turner', name: 'Turner', costPerHour: '30.00' }] }),
      { kind: 'added', itemId: 'turner', itemName: 'Turner', field: '', before: null, after: 'Turner' },
    ],
    [
      'an item removed',
      withMoney({ grades: grades.slice(0, -1) }),
      { kind: 'removed', itemId: 'finisher', before: 'Finisher', after: null },
    ],
    [
      'an item renamed keeps its id',
      withMoney({
        grades: grades.map((grade) => (grade.id === 'improver' ? { ...grade, name: 'Apprentice' } : grade)),
      }),
      {
        kind: 'changed',
        itemId: 'improver',
        itemName: 'Apprentice',
        field: 'name',
        before: 'Improver',
        after: 'Apprentice',
      },
    ],
  ])('tell %s in one line', (_sentence, after, expected) => {
    expect(cardDifferences(startCard, after)).toEqual([expect.objectContaining(expected)]);
  });

  it('name a step with its build-up', () => {
    const [first, ...others] = startCard.buildUps.buildUps;
    const steps =
      first?.steps.map((step) => (step.id === 'gesso' ? { ...step, coats: { ...step.coats, plain: 9 } } : step)) ?? [];
    const after = withBuildUps({ buildUps: first ? [{ ...first, steps }, ...others] : others });
    expect(cardDifferences(startCard, after)).toEqual([
      {
        kind: 'changed',
        section: 'buildUps',
        list: 'buildUps/steps',
        itemId: 'water-burnished/gesso',
        itemName: 'Water gilding, burnished · Gesso',
        field: 'coats.plain',
        before: 8,
        after: 9,
      },
    ]);
  });

  it('tell another way of overhead by what went and what came', () => {
    const told = cardDifferences(startCard, withMoney({ overhead: { way: 'share-of-labour', percent: '40' } }));
    expect(told.map(({ field, before, after }) => [field, before, after])).toEqual([
      ['overhead.way', 'per-hour', 'share-of-labour'],
      ['overhead.percent', null, '40'],
      ['overhead.perHour', '14.50', null],
    ]);
  });

  it('tell which items changed places', () => {
    const [one, other, ...rest] = grades;
    if (!one || !other) throw new Error('two grades are needed');
    expect(
      cardDifferences(startCard, withMoney({ grades: [other, one, ...rest] })).map(
        ({ kind, itemId, before, after }) => [kind, itemId, before, after],
      ),
    ).toEqual([
      ['moved', 'carver', 2, 1],
      ['moved', 'master-carver', 1, 2],
    ]);
  });

  const everything = leaves(startCard);

  it('law: a figure changed anywhere is one line, and the way back is the same line turned round', () => {
    fc.assert(
      fc.property(fc.constantFrom(...everything), (path) => {
        const after = changed(path);
        const there = cardDifferences(startCard, after);
        const back = cardDifferences(after, startCard);
        expect(there).toHaveLength(1);
        expect(back).toHaveLength(1);
        expect([back[0]?.before, back[0]?.after]).toEqual([there[0]?.after, there[0]?.before]);
        expect([back[0]?.section, back[0]?.itemId, back[0]?.field]).toEqual([
          there[0]?.section,
          there[0]?.itemId,
          there[0]?.field,
        ]);
      }),
      { numRuns: 200 },
    );
  });

  it('law: they come in the order of the parts', () => {
    fc.assert(
      fc.property(fc.constantFrom(...everything), fc.constantFrom(...everything), (one, other) => {
        fc.pre(one[0] !== other[0]);
        const [left, right] = [changed(one), changed(other)];
        const both = { ...left, [String(other[0])]: right[other[0] as keyof RateCard] };
        const sections = cardDifferences(startCard, both).map(({ section }) => section);
        const order = Object.keys(startCard);
        expect(sections).toHaveLength(2);
        expect(sections).toEqual([...sections].sort((a, b) => order.indexOf(a) - order.indexOf(b)));
      }),
    );
  });
});
