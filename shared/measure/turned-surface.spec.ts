import fc from 'fast-check';
import type { ClassicalElement, ProfileElement } from '#shared/measure/profile-element';
import { noEnds } from '#shared/measure/ends';
import { surfaceOf } from '#shared/measure/surface-of';

const turned = (profile: readonly ProfileElement[], radius_mm: number, ends = noEnds) =>
  surfaceOf({ kind: 'turned', profile, radius_mm, ends });

/** The area of frustums between very many circles of a curve: an integration that knows nothing of centroids. */
function byFrustums(curve: (part: number) => readonly [number, number]): number {
  let sum = 0;
  for (let step = 0; step < 20_000; step += 1) {
    const [r, z] = curve(step / 20_000);
    const [q, y] = curve((step + 1) / 20_000);
    sum += Math.PI * (r + q) * Math.hypot(q - r, y - z);
  }
  return sum;
}

const quarterTurn = (part: number) => [Math.sin((part * Math.PI) / 2), Math.cos((part * Math.PI) / 2)] as const;

/** Curves of members going out from a radius, as radius and height, written down anew from the drawing of each. */
const curves: Record<string, (member: ClassicalElement, radius_mm: number) => (part: number) => [number, number]> = {
  ovolo:
    ({ height_mm: h, projection_mm: p }, r) =>
    (part) => {
      const [sin, cos] = quarterTurn(part);
      return [r + p * sin, h * (1 - cos)];
    },
  cavetto:
    ({ height_mm: h, projection_mm: p }, r) =>
    (part) => {
      const [sin, cos] = quarterTurn(part);
      return [r + p * (1 - cos), h * sin];
    },
  torus:
    ({ height_mm: h, projection_mm: p }, r) =>
    (part) => {
      const angle = (part - 0.5) * Math.PI;
      return [r + p * Math.cos(angle), (h / 2) * (1 + Math.sin(angle))];
    },
};

describe('A turned piece', () => {
  it('of one upright face is a cylinder', () => {
    const face: ProfileElement = { id: 'a', element: 'line', across_mm: 0, up_mm: 100 };
    expect(turned([face], 40).area_mm2).toBeCloseTo(25_132.7412, 3);
  });

  it('of a sloping line is a frustum: radii 6 and 3, height 4', () => {
    expect(turned([{ id: 'a', element: 'line', across_mm: -3, up_mm: 4 }], 6).area_mm2).toBeCloseTo(141.3716694, 6);
  });

  it('of a half-round from the axis is a ball', () => {
    expect(turned([{ id: 'a', element: 'arc', across_mm: 0, up_mm: 60, bow_mm: 30 }], 0).area_mm2).toBeCloseTo(
      11_309.7336,
      3,
    );
  });

  it('agrees, element by element, with the integration of frustums (Pappus and Guldin)', () => {
    const size = fc.double({ min: 1, max: 80, noNaN: true });
    const element = fc.constantFrom('ovolo' as const, 'cavetto' as const, 'torus' as const);
    fc.assert(
      fc.property(element, size, size, size, (name, height_mm, projection_mm, radius_mm) => {
        const member: ClassicalElement = { id: 'a', element: name, height_mm, projection_mm, going: 'out' };
        const integrated = byFrustums(curves[name](member, radius_mm));
        expect(turned([member], radius_mm).area_mm2 / integrated).toBeCloseTo(1, 6);
      }),
      { numRuns: 40 },
    );
  });

  it('takes an end as the disc it is, a part of its own', () => {
    const face: ProfileElement = { id: 'a', element: 'line', across_mm: -10, up_mm: 100 };
    const open = turned([face], 40);
    const closed = turned([face], 40, { top: true, bottom: true });
    // Discs of radius 40 and 30.
    expect(closed.area_mm2 - open.area_mm2).toBeCloseTo(5026.5482 + 2827.4334, 3);
    expect(closed.parts.map(({ key }) => key)).toEqual(['a', 'end-bottom', 'end-top']);
  });

  it('runs round: its run is closed, and girth by run is its area', () => {
    const member: ProfileElement = { id: 'a', element: 'ovolo', height_mm: 20, projection_mm: 20, going: 'out' };
    const surface = turned([member], 30, { top: true, bottom: false });
    expect(surface.closedRun).toBe(true);
    expect((surface.girth_mm ?? 0) * (surface.run_mm ?? 0)).toBeCloseTo(surface.area_mm2, 6);
  });

  it('refuses a profile that runs through the axis', () => {
    expect(() => turned([{ id: 'a', element: 'line', across_mm: -41, up_mm: 100 }], 40)).toThrow(RangeError);
  });
});
