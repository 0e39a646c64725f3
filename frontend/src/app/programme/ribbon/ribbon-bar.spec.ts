import { ribbonBar } from './ribbon-bar';

describe('A bar of the ribbon', () => {
  it('is drawn from corner to corner and back', () => {
    expect(ribbonBar({ x: 10, width: 30 }, { y: 9, height: 36, radius: 0 })).toBe('M10 9h30v36h-30z');
  });

  it('is no rounder than it is long', () => {
    expect(ribbonBar({ x: 10, width: 4 }, { y: 14, height: 26, radius: 3 })).toBe(
      'M12 14h0a2 2 0 0 1 2 2v22a2 2 0 0 1 -2 2h0a2 2 0 0 1 -2 -2v-22a2 2 0 0 1 2 -2z',
    );
  });

  it('ends where it began', () => {
    const numbers = /-?\d+(\.\d+)?/g;
    const path = ribbonBar({ x: 3.14, width: 20.77 }, { y: 14, height: 26, radius: 3 });
    const across = [...path.matchAll(/h(-?[\d.]+)/g)].reduce((sum, [, by]) => sum + Number(by), 0);
    expect(across).toBeCloseTo(0, 9);
    expect(path.match(numbers)?.every((one) => Number.isFinite(Number(one)))).toBe(true);
  });
});
