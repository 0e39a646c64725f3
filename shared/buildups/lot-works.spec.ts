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
