import { arcAngle, arcCentre, arcRadius, arcReach } from '#shared/geometry/bowed-arc';
import type { Point } from '#shared/geometry/point';
import { strokeLength, strokeMoment, type Stroke } from '#shared/geometry/stroke';

/** Length and first moment of a curve by many chords, from outside the formulas. */
function byChords(curve: (part: number) => Point): { length: number; x: number; y: number } {
  const sum = { length: 0, x: 0, y: 0 };
  for (let step = 0; step < 100_000; step += 1) {
    const [from, to] = [curve(step / 100_000), curve((step + 1) / 100_000)];
    const length = Math.hypot(to.x - from.x, to.y - from.y);
    sum.length += length;
    sum.x += (length * (from.x + to.x)) / 2;
    sum.y += (length * (from.y + to.y)) / 2;
  }
  return sum;
}

const quarter = (a: number, b: number): Stroke => ({
  stroke: 'quarter',
  from: { x: 7, y: 3 },
  to: { x: 7 + a, y: 3 + b },
  centre: { x: 7, y: 3 + b },
});
// From below the centre round to its right.
const quarterCurve = (a: number, b: number) => (part: number) => ({
  x: 7 + a * Math.sin((part * Math.PI) / 2),
  y: 3 + b - b * Math.cos((part * Math.PI) / 2),
});

describe('A stroke', () => {
  it.each([
    [20, 20],
    [30, 10],
    [10, 30],
    [40, 0.5],
    [20, 20.0001],
  ])('a quarter-ellipse of %d by %d agrees with many chords in length and moment', (a, b) => {
    const chords = byChords(quarterCurve(a, b));
    expect(strokeLength(quarter(a, b)) / chords.length).toBeCloseTo(1, 7);
    expect(strokeMoment(quarter(a, b)).x / chords.x).toBeCloseTo(1, 7);
    expect(strokeMoment(quarter(a, b)).y / chords.y).toBeCloseTo(1, 7);
  });

  it('a quarter without a height is the straight line it has become', () => {
    expect(strokeLength(quarter(20, 0))).toBe(20);
    expect(strokeMoment(quarter(20, 0))).toEqual({ x: 20 * 17, y: 60 });
  });

  it.each([
    ['a half-round', 10],
    ['a shallow bow', 2],
    ['a hollow', -6],
    ['more than a half-round', 25],
  ])('%s over a chord of 20 agrees with many chords', (_what, bow) => {
    // Centre and radius from the chord by Pythagoras: (r − |s|)² + 10² = r².
    const radius = (100 + bow * bow) / (2 * Math.abs(bow));
    const half = Math.abs(bow) > 10 ? Math.PI - Math.asin(10 / radius) : Math.asin(10 / radius);
    const arc: Stroke = { stroke: 'arc', from: { x: 5, y: 0 }, to: { x: 5, y: 20 }, bow };
    const chords = byChords((part) => {
      const angle = (2 * part - 1) * half;
      return {
        x: 5 + Math.sign(bow) * (Math.abs(bow) - radius + radius * Math.cos(angle)),
        y: 10 + radius * Math.sin(angle),
      };
    });
    expect(strokeLength(arc) / chords.length).toBeCloseTo(1, 8);
    expect(strokeMoment(arc).x / chords.x).toBeCloseTo(1, 7);
    expect(strokeMoment(arc).y / chords.y).toBeCloseTo(1, 7);
  });

  it('an arc without a bow is a line; a hair’s bow hardly differs from one', () => {
    const line: Stroke = { stroke: 'line', from: { x: 1, y: 2 }, to: { x: 4, y: 6 } };
    expect(strokeLength(line)).toBe(5);
    expect(strokeMoment(line)).toEqual({ x: 12.5, y: 20 });
    for (const bow of [0, 1e-12, 1e-7]) {
      const arc: Stroke = { ...line, stroke: 'arc', bow };
      expect(strokeLength(arc)).toBeCloseTo(5, 10);
      expect(strokeMoment(arc).x).toBeCloseTo(12.5, 5);
    }
  });
});

describe('A bowed arc', () => {
  const half = { from: { x: 0, y: 0 }, to: { x: 0, y: 20 }, bow: 10 };

  it('bows to the right of its way: a half-round going up reaches out to the right', () => {
    expect(Math.max(...arcReach(half).map(({ x }) => x))).toBeCloseTo(10, 9);
    expect(Math.min(...arcReach({ ...half, bow: -10 }).map(({ x }) => x))).toBeCloseTo(-10, 9);
  });

  it('knows its circle', () => {
    expect(arcRadius(half)).toBeCloseTo(10, 12);
    expect(arcAngle(half)).toBeCloseTo(Math.PI, 12);
    expect(arcCentre(half)?.x).toBeCloseTo(0, 12);
    expect(arcCentre(half)?.y).toBeCloseTo(10, 12);
  });

  it('has no circle when it is straight', () => {
    expect(arcRadius({ ...half, bow: 0 })).toBe(Infinity);
    expect(arcCentre({ ...half, bow: 0 })).toBeUndefined();
  });
});
