import fc from 'fast-check';
import { layPlan } from '#shared/leaf/lay-plan';
import { layPlanBands } from '#shared/leaf/lay-plan-bands';
import { laysLaying } from '#shared/leaf/lays-laying';
import { patchesLaying } from '#shared/leaf/patches-laying';
import { ribbonLaying } from '#shared/leaf/ribbon-laying';
import { sheetsLaying } from '#shared/leaf/sheets-laying';

const step = { side_mm: 80, lap_mm: 3.2 };
const choice = { strips: null, fewestStrips: 1, leafCost: 2, pieceCost: 0.4 };
const ovolo = layPlanBands(laysLaying({ girth_mm: 47.1, run_mm: 2860, closedRun: false }, step, choice), step);
const fillet = layPlanBands(laysLaying({ girth_mm: 12, run_mm: 2860, closedRun: false }, step, choice), step);

describe('layPlan', () => {
  it('draws every strip of a short moulding, trimmed at its edges', () => {
    const [band] = layPlanBands(laysLaying({ girth_mm: 47.1, run_mm: 200, closedRun: false }, step, choice), step);
    const plan = layPlan([band], 100);
    expect(plan.isWhole).toBe(true);
    expect(plan.pieces).toHaveLength(6);
    expect(plan.pieces[0]).toMatchObject({ x_mm: 0, y_mm: 0, width_mm: 80 });
    expect(plan.pieces[5]?.x_mm).toBeCloseTo(153.6, 9);
    expect(plan.pieces[5]?.width_mm).toBeCloseTo(46.4, 9);
    expect(plan.pieces[5]?.height_mm).toBeCloseTo(47.1 - 23.4667, 3);
  });

  it('shows the beginning of a long one: eleven pieces of each of three courses', () => {
    const plan = layPlan([...ovolo, ...fillet], 33);
    expect(plan.isWhole).toBe(false);
    expect(plan.pieces).toHaveLength(33);
    expect(plan.shownLength_mm).toBeCloseTo(848, 9);
    expect(plan.length_mm).toBe(2860);
    expect(plan.height_mm).toBeCloseTo(59.1, 9);
  });

  it('sets bands one under the other', () => {
    const plan = layPlan([...ovolo, ...fillet], 33);
    expect(plan.pieces.filter(({ band }) => band === 1).map(({ y_mm }) => y_mm)).toEqual(
      Array.from({ length: 11 }, () => 47.1),
    );
  });

  it('draws sheets, patches and ribbon as they are counted', () => {
    const courses = [{ length_mm: 771.2, height_mm: 387.2, closed: false }];
    const sheets = layPlanBands(sheetsLaying({ area_mm2: 771.2 * 387.2, courses }, step), step);
    expect(layPlan(sheets, 1000).pieces).toHaveLength(50);
    const patches = layPlanBands(patchesLaying(3600 * 4, step, 2), step);
    expect(layPlan(patches, 1000)).toMatchObject({ length_mm: 120, height_mm: 120, isWhole: true });
    const ribbon = layPlanBands(
      ribbonLaying(
        { area_mm2: 1000 * 156.8, courses: [{ length_mm: 1000, height_mm: 156.8, closed: false }] },
        step,
        1e4,
      ),
      step,
    );
    expect(layPlan(ribbon, 1000).pieces.map(({ width_mm }) => width_mm)).toEqual([1000, 1000]);
  });

  it('draws nothing for nothing', () => {
    expect(layPlan([], 100)).toEqual({
      pieces: [],
      length_mm: 0,
      height_mm: 0,
      shownLength_mm: 0,
      shownHeight_mm: 0,
      isWhole: true,
    });
  });

  it('covers what it shows without gaps and keeps within its bound', () => {
    const size = fc.double({ min: 1, max: 5000, noNaN: true });
    fc.assert(
      fc.property(size, size, fc.integer({ min: 1, max: 200 }), (length_mm, height_mm, most) => {
        const plan = layPlan([{ length_mm, height_mm, pieceLength_mm: 80, pieceHeight_mm: 80, lap_mm: 3.2 }], most);
        expect(plan.pieces.length).toBeLessThanOrEqual(most);
        expect(plan.pieces.length).toBeGreaterThan(0);
        const right = Math.max(...plan.pieces.map(({ x_mm, width_mm }) => x_mm + width_mm));
        expect(right).toBeCloseTo(plan.shownLength_mm, 6);
        if (plan.isWhole) expect(plan.shownLength_mm).toBeCloseTo(length_mm, 3);
        expect(plan.pieces.every(({ width_mm, height_mm: high }) => width_mm > 0 && high > 0)).toBe(true);
      }),
    );
  });
});
