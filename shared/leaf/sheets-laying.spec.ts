import fc from 'fast-check';
import { sheetsLaying } from '#shared/leaf/sheets-laying';

const step = { side_mm: 80, lap_mm: 2 };
const course = (length_mm: number, height_mm: number, closed = false) => ({ length_mm, height_mm, closed });
const laid = (length_mm: number, height_mm: number, closed = false) =>
  sheetsLaying({ area_mm2: length_mm * height_mm, courses: [course(length_mm, height_mm, closed)] }, step);

describe('sheetsLaying', () => {
  it.each([
    ['five full courses of 11 and a strip 10 wide, eight from a leaf', 800, 400, 56.375, 66],
    ['an exact fit needs no strip', 782, 392, 50, 50],
    ['a field lower than a leaf takes strips of its whole height', 800, 30, 5.5, 11],
    ['a field lower than the lap is still covered', 800, 1.5, 11 / 53, 11],
    ['one leaf covers what is smaller than a leaf', 79, 79, 1, 1],
    ['nothing takes nothing', 0, 400, 0, 0],
  ])('%s', (_sentence, length_mm, height_mm, leaves, pieces) => {
    const { leaves: counted, pieces: handled } = laid(length_mm, height_mm);
    expect(counted).toBeCloseTo(leaves, 9);
    expect(handled).toBe(pieces);
  });

  it('lays in the direction that takes least', () => {
    const lying = laid(800, 400);
    const standing = laid(400, 800);
    expect(lying.leaves).toBe(standing.leaves);
    expect(lying.fields[0]?.direction).toBe('along');
    expect(standing.fields[0]?.direction).toBe('across');
  });

  it('keeps what the count came from', () => {
    expect(laid(800, 400).fields[0]).toMatchObject({ fullCourses: 5, leavesAlong: 11, strip_mm: 10, stripsPerLeaf: 8 });
  });

  it('laps the last leaf over the first on a closed band', () => {
    expect(laid(780, 80, true).leaves).toBe(10);
    expect(laid(780, 80, false).leaves).toBe(10);
    expect(laid(782, 80, false).leaves).toBe(10);
    expect(laid(782, 80, true).leaves).toBeCloseTo(10 + 1 / 20, 9);
  });

  it('counts any other shape by its area in squares of side less lap', () => {
    expect(sheetsLaying({ area_mm2: 608_400, courses: [] }, step).leaves).toBeCloseTo(100, 9);
  });

  it('counts by area what its fields leave over', () => {
    const box = sheetsLaying({ area_mm2: 782 * 392 + 6084, courses: [course(782, 392)] }, step);
    expect(box.leaves).toBeCloseTo(51, 9);
  });

  it('refuses a leaf no wider than two laps', () => {
    expect(() => sheetsLaying({ area_mm2: 1, courses: [] }, { side_mm: 4, lap_mm: 2 })).toThrow(RangeError);
  });

  const length = fc.double({ min: 0.5, max: 4000, noNaN: true });
  const anyStep = fc.record({
    side_mm: fc.double({ min: 60, max: 160, noNaN: true }),
    lap_mm: fc.double({ min: 0, max: 8, noNaN: true }),
  });

  it('never takes less leaf for a longer or higher field', () => {
    fc.assert(
      fc.property(length, length, length, anyStep, (l, h, more, how) => {
        const count = (a: number, b: number) => sheetsLaying({ area_mm2: a * b, courses: [course(a, b)] }, how).leaves;
        expect(count(l + more, h)).toBeGreaterThanOrEqual(count(l, h) * (1 - 1e-9));
        expect(count(l, h + more)).toBeGreaterThanOrEqual(count(l, h) * (1 - 1e-9));
      }),
    );
  });

  it('never lays less leaf than there is surface', () => {
    fc.assert(
      fc.property(length, length, fc.boolean(), anyStep, (l, h, closed, how) => {
        const { leaves } = sheetsLaying({ area_mm2: l * h, courses: [course(l, h, closed)] }, how);
        expect(leaves * how.side_mm ** 2).toBeGreaterThanOrEqual(l * h * (1 - 2e-6));
      }),
    );
  });
});
