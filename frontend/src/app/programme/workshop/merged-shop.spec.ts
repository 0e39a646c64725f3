import { TestBed } from '@angular/core/testing';
import { signIn, words } from '../../../test/sign-in';
import { Formats } from '../../core/formats/formats';
import { mergedShop, shopDifferences } from './merged-shop';
import { shopForSpecs } from './shop-for-specs';
import { ShopWords } from './shop-words';

const base = shopForSpecs();
const withPeople = (change: object) => ({ ...base, people: base.people.map((one) => ({ ...one, ...change })) });
const withRack = (change: object) => ({ ...base, places: base.places.map((one) => ({ ...one, ...change })) });

describe('Two people at the workshop’s data', () => {
  const differences = (mine: typeof base, theirs: typeof base) => {
    const known = { grades: [{ id: 'gilder', name: 'Gilder' }], memberships: [{ id: 'm1', name: 'Imke Vale' }] };
    return shopDifferences({ base, mine, theirs }, new ShopWords(TestBed.inject(Formats), known));
  };

  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [words] });
    signIn();
  });

  it('keep what each changed, where they changed other lines', () => {
    const sides = { base, mine: withRack({ capacity: 5 }), theirs: withPeople({ name: 'Ada Moss' }) };
    expect(differences(sides.mine, sides.theirs)).toEqual([]);
    const merged = mergedShop(sides, 'mine');
    expect([merged.places[0].capacity, merged.people[0].name]).toEqual([5, 'Ada Moss']);
  });

  it('are shown a line both changed, in words', () => {
    expect(differences(withRack({ capacity: 5 }), withRack({ capacity: 3 }))).toEqual([
      { name: 'Racks and benches, Long rack, How many', mine: '5', theirs: '3' },
    ]);
    expect(differences(withPeople({ membershipId: 'm1' }), withPeople({ membershipId: 'm2' }))).toEqual([
      { name: 'People, Ada, Whose sign-in it is', mine: 'Imke Vale', theirs: 'm2' },
    ]);
  });

  it('are told of hours as people write them, and of what was removed', () => {
    const closed = { ...base, hours: base.hours.map(() => []) };
    const short = { ...base, hours: base.hours.map((day) => day.slice(0, 1)) };
    const [{ name, mine, theirs }] = differences(closed, short);
    expect([name, mine.split('\n')[0], theirs.split('\n')[0]]).toEqual([
      'Hours',
      'Monday closed',
      'Monday 08:00–12:00',
    ]);
    expect(differences({ ...base, places: [] }, withRack({ capacity: 3 }))).toEqual([
      { name: 'Racks and benches, Long rack', mine: 'removed', theirs: 'Long rack' },
    ]);
  });

  it('decide such a line, and only it', () => {
    const sides = { base, mine: withRack({ capacity: 5, name: 'Tall rack' }), theirs: withRack({ capacity: 3 }) };
    expect(mergedShop(sides, 'theirs').places[0]).toMatchObject({ capacity: 3, name: 'Tall rack' });
    expect(mergedShop(sides, 'mine').places[0]).toMatchObject({ capacity: 5, name: 'Tall rack' });
  });
});
