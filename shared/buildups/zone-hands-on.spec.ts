import * as fc from 'fast-check';
import { layingCounts } from '#shared/buildups/laying-counts';
import { startBuildUps } from '#shared/buildups/start-buildups';
import { zoneForSpecs as zone } from '#shared/buildups/zone-for-specs';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { zoneHandsOn } from '#shared/buildups/zone-hands-on';

const card = startBuildUps;
const hoursOf = (facts: ZoneFacts, stepId: string) =>
  zoneHandsOn(facts, card).steps.find((step) => step.stepId === stepId)?.hours;
const laid = (way: 'sheets' | 'lays' | 'patches', form: 'loose' | 'transfer' | 'ribbon', first: number) => ({
  laying: { way, form, counts: { first, faulting: 0, second: 0 } },
});

describe('hands-on hours of a zone', () => {
  it.each([
    ['a size coat takes a quarter of an hour on a plain square metre', zone({}), 'size-coat', 0.25],
    ['gesso on flats is eight coats', zone({}), 'gesso', 3.6],
    [
      'gesso on finished carving is four coats, slower by the factor for carving',
      zone({ finish: 'carved' }),
      'gesso',
      3.24,
    ],
    ['carving that is recut gets eight coats', zone({ finish: 'carved', recutting: 'plain' }), 'gesso', 6.48],
    ['recut in the French manner it gets eleven', zone({ finish: 'carved', recutting: 'french' }), 'gesso', 8.91],
    ['smoothing carving takes three times as long', zone({ finish: 'carved' }), 'smooth', 6],
    ['smoothing mouldings goes by the factor for mouldings', zone({ finish: 'moulded' }), 'smooth', 2.6],
    ['hours go by plan area, whatever the relief adds', zone({ true_mm2: 1.7e6 }), 'burnish', 2.5],
    ['sheets go by the leaf', zone(laid('sheets', 'loose', 300)), 'lay', 6.5],
    ['lays go by the piece', zone(laid('lays', 'loose', 300)), 'lay', 4],
    ['patches go by the leaf', zone(laid('patches', 'loose', 100)), 'lay', 6],
    ['leaf is laid faster on oil size', zone({ buildUpId: 'oil-quick', ...laid('patches', 'loose', 100) }), 'lay', 4.5],
    [
      'transfer leaf is faster on flats',
      zone({ buildUpId: 'oil-quick', ...laid('sheets', 'transfer', 1000) }),
      'lay',
      14.625,
    ],
    [
      'and slower on carving',
      zone({ buildUpId: 'oil-quick', finish: 'carved', ...laid('patches', 'transfer', 100) }),
      'lay',
      6.3,
    ],
    ['an edge is protected by the metre', zone({ protectedEdge_mm: 2000 }), 'protect-edge', 0.6],
    [
      'burnishing the highs takes the share that is burnished',
      zone({ buildUpId: 'water-burnished-and-matte' }),
      'burnish',
      1,
    ],
    [
      'the share burnished may be said',
      zone({ buildUpId: 'water-burnished-and-matte', burnished_percent: 70 }),
      'burnish',
      1.75,
    ],
    [
      'matte size goes on the rest',
      zone({ buildUpId: 'water-burnished-and-matte', burnished_percent: 70 }),
      'matte-size',
      0.09,
    ],
    ['plain glaze goes by the square metre', zone({ buildUpId: 'white-glazes' }), 'glaze', 3.6],
    [
      'ornament painted in glazes goes by the dm²',
      zone({ buildUpId: 'white-glazes', paintedOrnament_mm2: 1e5 }),
      'glaze',
      21.24,
    ],
    [
      'recutting comes with the carving',
      zone({ finish: 'carved', recutting: 'plain', recutting_hours: 12 }),
      'recut',
      12,
    ],
  ] as const)('%s', (_sentence, facts, stepId, hours) => {
    expect(hoursOf(facts, stepId)?.likely).toBeCloseTo(hours, 9);
  });

  it('spreads gilding by the card, cleaning and consolidating by triples of their own', () => {
    const repair = zone({ buildUpId: 'local-repair', plan_mm2: 5e5 });
    expect(hoursOf(repair, 'clean')).toEqual({ low: 2, likely: 4, high: 7 });
    expect(hoursOf(repair, 'consolidate')).toEqual({ low: 2, likely: 4, high: 7.5 });
    const gesso = hoursOf(zone({}), 'gesso');
    expect(gesso?.low).toBeCloseTo(3.06, 9);
    expect(gesso?.high).toBeCloseTo(4.86, 9);
  });

  it('leaves recutting out of its sums, since carving counts it', () => {
    const without = zoneHandsOn(zone({ finish: 'carved', recutting: 'plain' }), card);
    const recut = zoneHandsOn(zone({ finish: 'carved', recutting: 'plain', recutting_hours: 40 }), card);
    expect(recut.hours).toEqual(without.hours);
    expect(recut.grades.map((grade) => grade.gradeId)).not.toContain('carver');
  });

  it('does optional steps only where chosen, and seals where the leaf needs it', () => {
    const stepIds = (facts: ZoneFacts) => zoneHandsOn(facts, card).steps.map((step) => step.stepId);
    const oil = zone({ buildUpId: 'oil-3-hour' });
    expect(stepIds(oil)).not.toContain('coloured-ground');
    expect(stepIds(oil)).not.toContain('seal');
    expect(stepIds({ ...oil, chosenStepIds: ['coloured-ground'] })).toContain('coloured-ground');
    expect(stepIds({ ...oil, needsSeal: true })).toContain('seal');
  });

  it('says which build-up the card does not hold, and that an edge has no step', () => {
    expect(zoneHandsOn(zone({ buildUpId: 'lost' }), card).findings).toMatchObject([
      { kind: 'missing', code: 'buildup-unknown' },
    ]);
    const onOil = zoneHandsOn(zone({ buildUpId: 'oil-quick', protectedEdge_mm: 500 }), card);
    expect(onOil.findings).toMatchObject([{ kind: 'missing', code: 'buildup-edge-not-in-steps' }]);
  });

  it('refuses a negative area', () => {
    expect(() => zoneHandsOn(zone({ plan_mm2: -1 }), card)).toThrow(RangeError);
  });

  it('law: hours grow with the area, start at nothing, and their grades add up to the whole', () => {
    const area = fc.double({ min: 0, max: 1e8, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...card.buildUps), area, area, ({ id }, one, more) => {
        const small = zoneHandsOn(zone({ buildUpId: id, plan_mm2: one }), card);
        const large = zoneHandsOn(zone({ buildUpId: id, plan_mm2: one + more }), card);
        expect(large.hours.likely).toBeGreaterThanOrEqual(small.hours.likely - 1e-9);
        expect(zoneHandsOn(zone({ buildUpId: id, plan_mm2: 0 }), card).hours).toEqual({ low: 0, likely: 0, high: 0 });
        const sum = small.grades.reduce((total, grade) => total + grade.hours.likely, 0);
        expect(sum).toBeCloseTo(small.hours.likely, 6);
        expect(small.hours.low).toBeLessThanOrEqual(small.hours.likely);
        expect(small.hours.likely).toBeLessThanOrEqual(small.hours.high);
      }),
    );
  });
});

describe('leaves split among layings', () => {
  it('takes the gross leaves apart as they were put together', () => {
    // 100 net leaves, a fifth laid twice, a quarter of the rest patched, one leaf in five broken: (100 + 20 + 20) ÷ 0.8 = 175.
    const counts = layingCounts(175, 0.25, 0.2);
    expect(counts.first).toBeCloseTo(125, 9);
    expect(counts.faulting).toBeCloseTo(25, 9);
    expect(counts.second).toBeCloseTo(25, 9);
  });
});
