import { meshArea, type Face, type Vertex } from '#shared/geometry/mesh-area';
import type { TwistedSection, TwistedShape } from '#shared/measure/leg-shape';
import { surfaceOf } from '#shared/measure/surface-of';

const twisted = (section: TwistedSection, turns: number, length_mm = 300): TwistedShape => ({
  kind: 'twisted',
  section,
  length_mm,
  turns,
  hand: 'right',
});
const areaOf = (shape: TwistedShape) => surfaceOf(shape).area_mm2;

/** A grid of triangles over a surface given by two parameters from 0 to 1. */
function gridArea(at: (u: number, v: number) => Vertex, [across, along]: readonly [number, number]): number {
  const vertices: Vertex[] = [];
  const faces: Face[] = [];
  for (let j = 0; j <= along; j += 1) for (let i = 0; i <= across; i += 1) vertices.push(at(i / across, j / along));
  for (let j = 0; j < along; j += 1)
    for (let i = 0; i < across; i += 1) {
      const corner = j * (across + 1) + i;
      faces.push([corner, corner + 1, corner + across + 1], [corner + 1, corner + across + 2, corner + across + 1]);
    }
  return meshArea(vertices, faces);
}

describe('A twisted member', () => {
  it('without lobes is a cylinder, however often it turns', () => {
    const round: TwistedSection = { outline: 'lobed', radius_mm: 20, depth_mm: 0, lobes: 3 };
    expect(areaOf(twisted(round, 0))).toBeCloseTo(37_699.1118, 3);
    expect(areaOf(twisted(round, 7))).toBeCloseTo(37_699.1118, 3);
  });

  it('of a square section not twisted is a square leg', () => {
    expect(areaOf(twisted({ outline: 'square', across_mm: 50 }, 0))).toBeCloseTo(60_000, 6);
  });

  it.each<[string, TwistedSection, (angle: number) => number, number]>([
    [
      'three lobes',
      { outline: 'lobed', radius_mm: 20, depth_mm: 12, lobes: 3 },
      (angle) => 20 + 6 * Math.cos(3 * angle),
      2,
    ],
    [
      'a square',
      { outline: 'square', across_mm: 40 },
      (angle) => 20 / Math.cos(((angle + Math.PI / 4) % (Math.PI / 2)) - Math.PI / 4),
      1.5,
    ],
  ])('with %s agrees with a fine mesh of itself', (_what, section, radiusAt, turns) => {
    const mesh = gridArea(
      (u, v) => {
        const angle = 2 * Math.PI * u;
        const turned = angle + 2 * Math.PI * turns * v;
        return [radiusAt(angle) * Math.cos(turned), radiusAt(angle) * Math.sin(turned), 300 * v];
      },
      [480, 480],
    );
    expect(areaOf(twisted(section, turns)) / mesh).toBeCloseTo(1, 3);
  });

  it('grows with its twist, and tells by how much', () => {
    const square: TwistedSection = { outline: 'square', across_mm: 40 };
    const areas = [0, 1, 2, 4].map((turns) => areaOf(twisted(square, turns)));
    expect(areas).toEqual([...areas].sort((a, b) => a - b));
    const reason = surfaceOf(twisted(square, 4)).reasons.find(({ code }) => code === 'measure-twist');
    expect(reason?.figure).toBeCloseTo(areas[3] / areas[0], 9);
  });

  it('is good to 1e-6 at the sharpest section it may have', () => {
    // 64 lobes down to the axis, not twisted: 64 equal leaves of ρ = 20(1 + cos 64φ), measured by very many chords.
    let outline_mm = 0;
    const at = (step: number) => {
      const angle = (2 * Math.PI * step) / 2_000_000;
      const radius = 20 * (1 + Math.cos(64 * angle));
      return [radius * Math.cos(angle), radius * Math.sin(angle)];
    };
    for (let step = 0; step < 2_000_000 / 64; step += 1) {
      const [x, y] = at(step);
      const [u, v] = at(step + 1);
      outline_mm += Math.hypot(u - x, v - y);
    }
    const sharp = twisted({ outline: 'lobed', radius_mm: 20, depth_mm: 40, lobes: 64 }, 0);
    expect(areaOf(sharp) / (64 * outline_mm * 300)).toBeCloseTo(1, 6);
  });
});

describe('A helicoid', () => {
  const ribbon = {
    kind: 'helicoid',
    radius_mm: 40,
    coreRadius_mm: 20,
    risePerTurn_mm: 120,
    turns: 2,
    hand: 'left',
  } as const;

  it('agrees with a fine mesh of itself', () => {
    const mesh = gridArea(
      (u, v) => {
        const [radius, angle] = [20 + 20 * u, 4 * Math.PI * v];
        return [radius * Math.cos(angle), radius * Math.sin(angle), 240 * v];
      },
      [60, 1200],
    );
    expect(surfaceOf(ribbon).area_mm2 / mesh).toBeCloseTo(1, 4);
  });

  it('that does not rise is a flat ring, turn by turn', () => {
    expect(surfaceOf({ ...ribbon, risePerTurn_mm: 0 }).area_mm2).toBeCloseTo(7539.8224, 3);
  });
});
