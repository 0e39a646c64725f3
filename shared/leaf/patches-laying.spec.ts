import fc from 'fast-check';
import { patchesLaying } from '#shared/leaf/patches-laying';

describe('patchesLaying', () => {
  it.each([
    ['cut two by two, 80 mm leaf with laps of 5 covers squares of 70', 49_000, 5, 2, 10, 40],
    ['whole leaves cover squares of side less one lap', 56_250, 5, 1, 10, 10],
    ['without laps a leaf covers its own area', 64_000, 0, 3, 10, 90],
    ['nothing takes nothing', 0, 5, 2, 0, 0],
  ])('%s', (_sentence, area_mm2, lap_mm, cuts, leaves, pieces) => {
    const laid = patchesLaying(area_mm2, { side_mm: 80, lap_mm }, cuts);
    expect(laid.leaves).toBeCloseTo(leaves, 9);
    expect(laid.pieces).toBeCloseTo(pieces, 9);
  });

  it('refuses cuts no wider than two laps', () => {
    expect(() => patchesLaying(100, { side_mm: 80, lap_mm: 5 }, 8)).toThrow(RangeError);
  });

  it('never lays less leaf than there is surface, and never less for more cuts', () => {
    const area = fc.double({ min: 1e-3, max: 1e7, noNaN: true });
    fc.assert(
      fc.property(
        area,
        fc.double({ min: 0, max: 4, noNaN: true }),
        fc.integer({ min: 1, max: 7 }),
        (area_mm2, lap_mm, cuts) => {
          const step = { side_mm: 80, lap_mm };
          const { leaves } = patchesLaying(area_mm2, step, cuts);
          expect(leaves * 6400).toBeGreaterThanOrEqual(area_mm2 * (1 - 1e-12));
          expect(patchesLaying(area_mm2, step, cuts + 1).leaves).toBeGreaterThanOrEqual(leaves);
        },
      ),
    );
  });
});
