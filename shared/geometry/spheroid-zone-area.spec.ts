import { spheroidRadiusAt, spheroidZoneArea, type Spheroid } from '#shared/geometry/spheroid-zone-area';

/** Area by many frustums between circles of the body, from outside the formula. */
function byFrustums({ radius, halfHeight }: Spheroid, from: number, to: number): number {
  // Steps of equal angle keep the poles fine.
  const [first, last] = [Math.asin(from / halfHeight), Math.asin(to / halfHeight)];
  const circle = (step: number) => {
    const angle = first + ((last - first) * step) / 20_000;
    return [radius * Math.cos(angle), halfHeight * Math.sin(angle)];
  };
  let sum = 0;
  for (let step = 0; step < 20_000; step += 1) {
    const [r, z] = circle(step);
    const [q, y] = circle(step + 1);
    sum += Math.PI * (r + q) * Math.hypot(q - r, y - z);
  }
  return sum;
}

describe('The zone of a spheroid', () => {
  it.each<[string, Spheroid, [number, number]]>([
    ['a flattened bun', { radius: 50, halfHeight: 30 }, [-25, 28]],
    ['a lengthened egg', { radius: 20, halfHeight: 45 }, [-45, 10]],
    ['a very flat button', { radius: 60, halfHeight: 2 }, [0, 2]],
    ['nearly a sphere', { radius: 30.0001, halfHeight: 30 }, [-10, 20]],
    ['a needle', { radius: 1, halfHeight: 80 }, [-80, 80]],
  ])('of %s agrees with many frustums', (_what, body, [from, to]) => {
    expect(spheroidZoneArea(body, [from, to]) / byFrustums(body, from, to)).toBeCloseTo(1, 6);
  });

  it('of a whole sphere of radius 1 is 4π', () => {
    expect(spheroidZoneArea({ radius: 1, halfHeight: 1 }, [-1, 1])).toBeCloseTo(12.566370614359172, 12);
  });

  it('without a width is nothing, without a height both its discs', () => {
    expect(spheroidZoneArea({ radius: 0, halfHeight: 5 }, [-5, 5])).toBe(0);
    expect(spheroidZoneArea({ radius: 1, halfHeight: 0 }, [0, 0])).toBeCloseTo(6.283185307179586, 12);
  });

  it('refuses a zone outside its body', () => {
    expect(() => spheroidZoneArea({ radius: 5, halfHeight: 5 }, [0, 6])).toThrow(RangeError);
  });

  it('has its radius at a height: 3, 4, 5', () => {
    expect(spheroidRadiusAt({ radius: 5, halfHeight: 5 }, 3)).toBeCloseTo(4, 12);
    expect(spheroidRadiusAt({ radius: 5, halfHeight: 5 }, 6)).toBe(0);
  });
});
