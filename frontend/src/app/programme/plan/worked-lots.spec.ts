import { lotEntriesSchema, lotsWith } from './lot-entries';
import { programmeForSpecs } from './programme-for-specs';
import { workedLots } from './worked-lots';

const answer = programmeForSpecs();
const [legs] = workedLots(answer);
const nothing = { portions: null, crew: null, mostPeople: null, places: null };

describe('How lots are worked', () => {
  it('is told of what is coated, as it is planned, with what bounds it', () => {
    expect(workedLots(answer)).toEqual([
      {
        ...{ lotId: 'legs', name: 'Legs', piece: 'Base', input: null, portions: 1, crew: 1, mostPeople: 2, places: 1 },
        ...{ hasWindows: true, scarce: { grade: 'Gilder', people: 2 }, rack: { name: 'Long rack', capacity: 2 } },
      },
    ]);
  });

  it.each([
    ['more hands than there are', { ...nothing, crew: 3 }, 'crew', 'programme-crew-short'],
    ['fewer who may than must', { ...nothing, crew: 2, mostPeople: 1 }, 'mostPeople', 'programme-lot-fewer-may'],
    ['more places than the rack has', { ...nothing, places: 3 }, 'places', 'programme-place-short'],
  ])('is complained of where it takes %s', (_why, entries, path, code) => {
    const parsed = lotEntriesSchema(legs).safeParse(entries);
    const told = parsed.error?.issues.map((issue) => [issue.path, issue.message]);
    expect(told).toEqual([[[path], code]]);
  });

  it.each([
    ['as proposed', nothing],
    ['in three portions', { ...nothing, portions: 3 }],
    ['by all there are, on all there is', { portions: 2, crew: 2, mostPeople: 2, places: 2 }],
  ])('may be %s', (_how, entries) => {
    expect(lotEntriesSchema(legs).safeParse(entries).success).toBe(true);
  });

  it('stands with the other lots, and not at all where it is as proposed', () => {
    const other = { lotId: 'apron', ...nothing, crew: 2 };
    const entered = lotsWith([other], 'legs', { ...nothing, portions: 2 });
    expect(entered).toEqual([other, { lotId: 'legs', ...nothing, portions: 2 }]);
    expect(lotsWith(entered, 'legs', nothing)).toEqual([other]);
  });
});
