import type { ShopContent } from '#shared/programme/shop-schema';

const id = (last: number): string => `018f0000-0000-7000-8000-00000000000${last}`;
const day = [
  { start_minutes: 480, end_minutes: 720 },
  { start_minutes: 750, end_minutes: 1020 },
];

/** A workshop of one person and one rack, open from Monday to Friday. */
export const shopForSpecs = (): ShopContent => ({
  hours: [day, day, day, day, day, [], []],
  productiveShare_percent: 80,
  overtime_percent: 50,
  days: [],
  climates: [],
  places: [{ id: id(1), name: 'Long rack', kind: 'rack', capacity: 2 }],
  people: [{ id: id(2), name: 'Ada', gradeIds: ['gilder'], hours: null, absences: [], membershipId: null }],
});
