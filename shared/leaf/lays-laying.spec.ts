import fc from 'fast-check';
import { laysLaying } from '#shared/leaf/lays-laying';

const step = { side_mm: 80, lap_mm: 3.2 };
const usual = { strips: null, fewestStrips: 1, leafCost: 2.08, pieceCost: 0.44 };
const moulding = (girth_mm: number, run_mm: number, closedRun = false) => ({ girth_mm, run_mm, closedRun });

describe('laysLaying', () => {
  it.each([
    ['an ovolo of 47.1 mm takes two lays of three strips a leaf', 47.1, 2860, usual, 3, 2, 38, 25.3333],
    ['a fillet of 12 mm takes one lay of six strips a leaf', 12, 2860, usual, 6, 1, 38, 6.3333],
    ['dear laying goes with whole leaves', 47.1, 2860, { ...usual, pieceCost: 10 }, 1, 1, 38, 38],
    [
      'carving is never laid in whole leaves by itself',
      47.1,
      2860,
      { ...usual, pieceCost: 10, fewestStrips: 2 },
      3,
      2,
      38,
      25.3333,
    ],
    ['strips somebody chose are kept', 47.1, 2860, { ...usual, strips: 2 }, 2, 2, 38, 38],
    ['equal cost goes to the fewest pieces', 47.1, 2860, { ...usual, leafCost: 0, pieceCost: 0 }, 1, 1, 38, 38],
    ['a girth below the lap is one lay', 2, 2860, usual, 8, 1, 38, 4.75],
  ])('%s', (_sentence, girth_mm, run_mm, choice, strips, lays, along, leaves) => {
    const laid = laysLaying(moulding(girth_mm, run_mm), step, choice);
    expect(laid.chosen).toMatchObject({ strips, laysAcross: lays, piecesAlong: along });
    expect(laid.leaves).toBeCloseTo(leaves, 4);
    expect(laid.pieces).toBe(lays * along);
  });

  it('an exact fit stays one: ten pieces of 76.8 and the last lap', () => {
    expect(laysLaying(moulding(60, 771.2), step, usual).chosen.piecesAlong).toBe(10);
    expect(laysLaying(moulding(60, 771.3), step, usual).chosen.piecesAlong).toBe(11);
  });

  it('a closed run laps its last piece over the first', () => {
    expect(laysLaying(moulding(60, 768, true), step, usual).chosen.piecesAlong).toBe(10);
    expect(laysLaying(moulding(60, 771.2, true), step, usual).chosen.piecesAlong).toBe(11);
  });

  it('shows every way to cut the leaf whose strips are wider than two laps', () => {
    expect(laysLaying(moulding(60, 900), step, usual).options.map((next) => next.strips)).toEqual([
      1, 2, 3, 4, 5, 6, 7, 8,
    ]);
    expect(laysLaying(moulding(60, 900), { side_mm: 30, lap_mm: 3 }, usual).options.map((next) => next.strips)).toEqual(
      [1, 2, 3, 4],
    );
  });

  it('falls back to whole leaves where carving leaves no room for two strips', () => {
    expect(
      laysLaying(moulding(60, 900), { side_mm: 12, lap_mm: 3.2 }, { ...usual, fewestStrips: 2 }).chosen.strips,
    ).toBe(1);
  });

  it('cuts small pieces whole from a leaf: three by two of 25 by 30', () => {
    const laid = laysLaying(moulding(25, 30), step, usual);
    expect(laid.small).toEqual({ across: 3, along: 2 });
    expect(laid.leaves).toBeCloseTo(1 / 6, 12);
    expect(laid.pieces).toBe(1);
  });

  it('half a leaf is no longer a small piece', () => {
    expect(laysLaying(moulding(25, 40), step, usual).small).toBeNull();
  });

  it('a small piece that has none like it shares its leaf with nothing: one strip of three', () => {
    expect(laysLaying(moulding(25, 30), step, { ...usual, isAlone: true })).toMatchObject({
      small: null,
      leaves: 1 / 3,
    });
  });

  it('nothing takes nothing', () => {
    expect(laysLaying(moulding(0, 900), step, usual)).toMatchObject({ leaves: 0, pieces: 0 });
    expect(laysLaying(moulding(40, 0), step, usual)).toMatchObject({ leaves: 0, pieces: 0 });
  });

  const length = fc.double({ min: 0.5, max: 3000, noNaN: true });

  it('never takes less leaf for more run or girth with the same strips', () => {
    fc.assert(
      fc.property(length, length, length, fc.integer({ min: 1, max: 8 }), (girth, run, more, strips) => {
        const count = (g: number, r: number) => laysLaying(moulding(g, r), step, { ...usual, strips }).leaves;
        expect(count(girth + more, run)).toBeGreaterThanOrEqual(count(girth, run));
        expect(count(girth, run + more)).toBeGreaterThanOrEqual(count(girth, run));
      }),
    );
  });

  it('never lays less leaf than there is surface, and chooses no dearer cut than any other', () => {
    fc.assert(
      fc.property(length, length, fc.boolean(), (girth, run, closed) => {
        const laid = laysLaying(moulding(girth, run, closed), step, usual);
        expect(laid.leaves * 6400).toBeGreaterThanOrEqual(girth * run * (1 - 2e-6));
        expect(Math.min(...laid.options.map((next) => next.cost))).toBe(laid.chosen.cost);
      }),
    );
  });
});
