import fc from 'fast-check';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import { mergedValues, type CardSide } from '#shared/rate-cards/merged-values';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startCard } from '#shared/rate-cards/start-card';
import { withValueAt } from '#shared/rate-cards/tables/value-at';

const base: RateCard = startCard;
const gilder = ['money', 'grades', 2, 'costPerHour'];
const carver = ['money', 'grades', 1, 'costPerHour'];

const merge = (mine: RateCard, theirs: RateCard, sideOf: (key: string) => CardSide = () => 'mine') =>
  mergedValues({ base, mine, theirs }, sideOf);
const lines = (card: RateCard) => cardDifferences(base, card).map(({ kind, itemId, field }) => [kind, itemId, field]);
const withGrades = (change: (grades: RateCard['money']['grades']) => RateCard['money']['grades']): RateCard => ({
  ...base,
  money: { ...base.money, grades: change(base.money.grades) },
});

describe('Two who changed one card', () => {
  it('each in another line: both changes stand, and nothing is asked', () => {
    const { value, overlaps } = merge(withValueAt(base, gilder, '34.00'), withValueAt(base, carver, '32.00'));
    expect(overlaps).toEqual([]);
    expect([value.money.grades[1].costPerHour, value.money.grades[2].costPerHour]).toEqual(['32.00', '34.00']);
  });

  it('in two fields of one item: both stand', () => {
    const mine = withValueAt(base, gilder, '34.00');
    const theirs = withValueAt(base, ['money', 'grades', 2, 'name'], 'Water gilder');
    expect(merge(mine, theirs).value.money.grades[2]).toMatchObject({ name: 'Water gilder', costPerHour: '34.00' });
  });

  it('to the same: it is one change', () => {
    const same = withValueAt(base, gilder, '34.00');
    expect(merge(same, withValueAt(base, gilder, '34.00'))).toEqual({ value: same, overlaps: [] });
  });

  it('in one line: it is asked, and stands as chosen', () => {
    const [mine, theirs] = [withValueAt(base, gilder, '34.00'), withValueAt(base, gilder, '40.00')];
    expect(merge(mine, theirs).overlaps).toEqual([{ key: 'money/grades/gilder/costPerHour' }]);
    expect(merge(mine, theirs).value).toEqual(mine);
    expect(merge(mine, theirs, () => 'theirs').value).toEqual(theirs);
  });

  it('by moving and by changing an item: it is found by its id', () => {
    const mine = withGrades(([first, ...rest]) => [...rest, first]);
    const { value, overlaps } = merge(mine, withValueAt(base, gilder, '40.00'));
    expect(overlaps).toEqual([]);
    expect(value.money.grades.map(({ id }) => id)).toEqual(mine.money.grades.map(({ id }) => id));
    expect(value.money.grades.find(({ id }) => id === 'gilder')?.costPerHour).toBe('40.00');
  });

  it('by adding one item each: both are there, each after its neighbour', () => {
    const added = (id: string) => ({ ...base.money.grades[2], id, name: id });
    const mine = withGrades((grades) => [...grades.slice(0, 1), added('turner'), ...grades.slice(1)]);
    const theirs = withGrades((grades) => [...grades, added('polisher')]);
    const { value, overlaps } = merge(mine, theirs);
    const ids = base.money.grades.map(({ id }) => id);
    expect(value.money.grades.map(({ id }) => id)).toEqual([ids[0], 'turner', ...ids.slice(1), 'polisher']);
    expect(overlaps).toEqual([]);
  });

  it('one removing what the other left: it goes; what the other changed: it is asked', () => {
    const without = withGrades((grades) => grades.filter(({ id }) => id !== 'gilder'));
    expect(merge(without, withValueAt(base, carver, '32.00')).overlaps).toEqual([]);
    const changed = withValueAt(base, gilder, '40.00');
    expect(merge(without, changed).overlaps).toEqual([{ key: 'money/grades/gilder' }]);
    expect(merge(without, changed).value).toEqual(without);
    expect(merge(without, changed, () => 'theirs').value.money.grades.map(({ id }) => id)).toContain('gilder');
  });

  it('one choosing another way of working: its figures go with it as one line', () => {
    const mine: RateCard = { ...base, money: { ...base.money, overhead: { way: 'share-of-labour', percent: '60' } } };
    const theirs: RateCard = { ...base, money: { ...base.money, overhead: { way: 'per-hour', perHour: '20' } } };
    expect(merge(mine, theirs).overlaps).toEqual([{ key: 'money/overhead' }]);
    expect(merge(mine, theirs, () => 'theirs').value.money.overhead).toEqual({ way: 'per-hour', perHour: '20' });
  });

  it('with whichever lines: none is lost, and none is asked that only one of them changed', () => {
    const prices = base.money.grades.map((_, at) => at);
    const some = fc.uniqueArray(fc.constantFrom(...prices));
    const changed = (places: readonly number[], price: string) =>
      places.reduce((card, at) => withValueAt(card, ['money', 'grades', at, 'costPerHour'], price), base);
    fc.assert(
      fc.property(some, some, (one, other) => {
        const { value, overlaps } = merge(changed(one, '71.00'), changed(other, '72.00'));
        expect(new Set(overlaps.map(({ key }) => key)).size).toBe(one.filter((at) => other.includes(at)).length);
        expect(lines(value)).toHaveLength(new Set([...one, ...other]).size);
        for (const at of other) expect(value.money.grades[at].costPerHour).toBe(one.includes(at) ? '71.00' : '72.00');
      }),
    );
  });
});
