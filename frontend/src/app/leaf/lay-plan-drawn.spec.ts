import type { LayPlanBand } from '#shared/leaf/lay-plan';
import { layPlanDrawn } from './lay-plan-drawn';

const strips = (height_mm: number, strip_mm: number): LayPlanBand => ({
  length_mm: 2860,
  height_mm,
  pieceLength_mm: 80,
  pieceHeight_mm: strip_mm,
  lap_mm: 3.2,
});
const ovolo = strips(47.1, 26.7);
const fillet = strips(12, 13.3);
const kinds = (drawn: ReturnType<typeof layPlanDrawn>, kind: string) =>
  drawn.view.paths.filter((path) => path.kind === kind).flatMap(({ data }) => data.split('M').slice(1));

describe('layPlanDrawn', () => {
  it('shows the beginning of a long moulding, its girth whole and to scale', () => {
    const drawn = layPlanDrawn([ovolo, fillet]);
    expect(drawn.plan.isWhole).toBe(false);
    expect(drawn.view.box.height_mm).toBeCloseTo(59.1, 6);
    // Seven leaves along in steps of 76.8 mm, the last one whole.
    expect(drawn.view.box.width_mm).toBeCloseTo(6 * 76.8 + 80, 6);
  });

  it('draws every piece once, neighbours in two shades', () => {
    const drawn = layPlanDrawn([ovolo, fillet]);
    expect(kinds(drawn, 'leaf').length + kinds(drawn, 'pale').length).toBe(drawn.plan.pieces.length);
    expect(Math.abs(kinds(drawn, 'leaf').length - kinds(drawn, 'pale').length)).toBeLessThanOrEqual(1);
  });

  it('darkens a lap at every joint along and across', () => {
    // Two courses of seven: six joints along in each, seven across.
    expect(kinds(layPlanDrawn([ovolo]), 'lap')).toHaveLength(2 * 6 + 7);
  });

  it('shows all of a broad field', () => {
    const field = { length_mm: 771.2, height_mm: 387.2, pieceLength_mm: 80, pieceHeight_mm: 80, lap_mm: 3.2 };
    const drawn = layPlanDrawn([field]);
    expect(drawn.plan.isWhole).toBe(true);
    expect(drawn.plan.pieces).toHaveLength(50);
  });

  it('puts carved repeats clear of the plan, to its scale', () => {
    const tops: number[] = [];
    const row = { height_mm: 30, path: (top_mm: number, to_mm: number) => (tops.push(top_mm), `M0 0H${to_mm}`) };
    const drawn = layPlanDrawn([ovolo], [row]);
    expect(tops[0]).toBeGreaterThan(47.1);
    expect(drawn.view.box.height_mm).toBeCloseTo((tops[0] ?? 0) + 30, 6);
  });

  it('draws nothing for nothing', () => {
    expect(layPlanDrawn([]).plan.pieces).toEqual([]);
  });
});
