import * as fc from 'fast-check';
import { lotWorks } from '#shared/buildups/lot-works';
import { setUpDays } from '#shared/buildups/set-up-days';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';

const card = startBuildUps;
const stepOf = (buildUpId: string, stepId: string) => {
  const step = card.buildUps.find(({ id }) => id === buildUpId)?.steps.find(({ id }) => id === stepId);
  if (!step) throw new Error('no such step');
  return step;
};

describe('lots', () => {
  it('coat together what has the same build-up on the same piece, water before oil', () => {
    const lots = lotWorks(
      [
        zone({ id: 'a', pieceId: 'table', buildUpId: 'oil-quick' }),
        zone({ id: 'b', pieceId: 'table' }),
        zone({ id: 'c', pieceId: 'stand' }),
        zone({ id: 'd', pieceId: 'table' }),
        zone({ id: 'e', pieceId: 'table', buildUpId: 'lost' }),
      ],
      card,
    );
    expect(lots.map(({ id, zoneIds }) => [id, zoneIds])).toEqual([
      ['table/water-burnished', ['b', 'd']],
      ['table/oil-quick', ['a']],
      ['stand/water-burnished', ['c']],
    ]);
  });

  it('follow the lot a member names, within its piece and build-up, water still before oil', () => {
    const lots = lotWorks(
      [
        zone({ id: 'a', pieceId: 'table', lot: 'Legs', buildUpId: 'oil-quick' }),
        zone({ id: 'b', pieceId: 'table' }),
        zone({ id: 'c', pieceId: 'table', lot: 'Legs' }),
        zone({ id: 'd', pieceId: 'stand', lot: 'Legs' }),
        zone({ id: 'e', pieceId: 'table', lot: 'Legs' }),
        zone({ id: 'f', pieceId: 'table', buildUpId: 'oil-quick' }),
      ],
      card,
    );
    expect(lots.map(({ id, name, zoneIds }) => [id, name, zoneIds])).toEqual([
      ['table/water-burnished', '', ['b']],
      ['table/water-burnished/Legs', 'Legs', ['c', 'e']],
      ['table/oil-quick/Legs', 'Legs', ['a']],
      ['table/oil-quick', '', ['f']],
      ['stand/water-burnished/Legs', 'Legs', ['d']],
    ]);
  });

  it('are set up each for itself: of two equal flats in two lots every step is set up twice', () => {
    const [together, apart] = ['', 'Lid'].map((lot) =>
      lotWorks([zone({ id: 'a', plan_mm2: 1e5 }), zone({ id: 'b', plan_mm2: 1e5, lot })], card),
    );
    const setUp = (lots: typeof together) => (lots ?? []).reduce((sum, lot) => sum + lot.setUp_hours, 0);
    expect(setUp(apart)).toBeCloseTo(2 * setUp(together), 9);
  });

  it('law: however zones are named into lots, each is in one lot, hours stay, and no grouping takes less set-up than the proposed', () => {
    const anyZone = fc.record({
      pieceId: fc.constantFrom('table', 'stand'),
      buildUpId: fc.constantFrom('water-burnished', 'oil-12-hour', 'white-glazes'),
      lot: fc.constantFrom('', 'Legs', 'Frame'),
      plan_mm2: fc.integer({ min: 1_000, max: 4_000_000 }),
      finish: fc.constantFrom('plain', 'moulded', 'carved'),
    });
    fc.assert(
      fc.property(fc.array(anyZone, { minLength: 1, maxLength: 8 }), (given) => {
        const zones = given.map((one, at) => zone({ ...one, id: `zone ${at}`, true_mm2: one.plan_mm2 }));
        const proposed = lotWorks(
          zones.map((one) => ({ ...one, lot: '' })),
          card,
        );
        const lots = lotWorks(zones, card);
        const sumOf = (of: typeof lots, figure: 'hours' | 'setUp_hours') =>
          of.flatMap(({ steps }) => steps).reduce((sum, step) => sum + step[figure], 0);
        expect(lots.flatMap(({ zoneIds }) => zoneIds).sort()).toEqual(zones.map(({ id }) => id).sort());
        expect(new Set(lots.map(({ id }) => id)).size).toBe(lots.length);
        expect(sumOf(lots, 'hours')).toBeCloseTo(sumOf(proposed, 'hours'), 6);
        expect(sumOf(lots, 'setUp_hours')).toBeGreaterThanOrEqual(sumOf(proposed, 'setUp_hours') - 1e-9);
      }),
    );
  });

  it('adds the hours of their zones and takes the most coats', () => {
    const [lot] = lotWorks([zone({ id: 'flat' }), zone({ id: 'carved', finish: 'carved' })], card);
    const gesso = lot?.steps.find(({ stepId }) => stepId === 'gesso');
    expect(gesso?.coats).toBe(8);
    expect(gesso?.hours).toBeCloseTo(3.6 + 3.24, 9);
  });

  it.each([
    ['work of an hour is set up once', 'water-burnished', 'gesso', { hours: 1, coats: 8 }, 1],
    ['6.8 productive hours are one day', 'water-burnished', 'lay', { hours: 6.8, coats: 1 }, 1],
    ['a little more is two', 'water-burnished', 'lay', { hours: 6.9, coats: 1 }, 2],
    ['coats that dry for a day are set up each on its own', 'white-glazes', 'glaze', { hours: 2, coats: 3 }, 3],
    ['no work needs no set-up', 'water-burnished', 'fault', { hours: 0, coats: 1 }, 0],
    ['recutting is the carver’s', 'water-burnished', 'recut', { hours: 30, coats: 1 }, 0],
  ] as const)('%s', (_sentence, buildUpId, stepId, load, days) => {
    expect(setUpDays(stepOf(buildUpId, stepId), load, card)).toBe(days);
  });

  it('set-up is counted once for the whole lot', () => {
    const one = lotWorks([zone({ id: 'a', plan_mm2: 2e5 })], card)[0]?.setUp_hours;
    const two = lotWorks([zone({ id: 'a', plan_mm2: 1e5 }), zone({ id: 'b', plan_mm2: 1e5 })], card)[0]?.setUp_hours;
    expect(two).toBe(one);
  });
});
