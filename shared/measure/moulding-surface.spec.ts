import type { MouldingPlan, MouldingShape } from '#shared/measure/moulding-shape';
import type { ProfileElement } from '#shared/measure/profile-element';
import { surfaceOf } from '#shared/measure/surface-of';

/** A flat step ten wide: its surface on a plan is the flat margin between two outlines, which can be worked by hand. */
const step: ProfileElement = { id: 'step', element: 'line', across_mm: 10, up_mm: 0 };

const moulding = (plan: MouldingPlan, more: Partial<MouldingShape> = {}): MouldingShape => ({
  kind: 'moulding',
  profile: [step],
  plan,
  measuredAt: 'back',
  facing: 'outward',
  ...more,
});

const rectangle: MouldingPlan = {
  form: 'polygon',
  sides_mm: [400, 300, 400, 300],
  turns_degrees: [90, 90, 90, 90],
  closed: true,
};
const inward = { facing: 'inward' } as const;

describe('A moulding on its plan', () => {
  it.each<[string, MouldingShape, number]>([
    ['along straight lengths', moulding({ form: 'straight', sides_mm: [500, 300], returns_mm: [] }), 8000],
    // 420 × 320 less 400 × 300.
    ['round the outside of a box', moulding(rectangle), 14_400],
    // 400 × 300 less 380 × 280.
    ['round the inside of a frame', moulding(rectangle, inward), 13_600],
    ['round a box measured over its front', moulding(rectangle, { measuredAt: 'front' }), 13_600],
    ['round an opening measured at the sight edge', moulding(rectangle, { ...inward, measuredAt: 'front' }), 14_400],
    // A trapezium 500 and 520 long, and two right-angled triangles of 10.
    ['returned to the wall at both ends', moulding({ form: 'straight', sides_mm: [500], returns_mm: [0, 0] }), 5200],
    [
      'along a front and two sides with square mitres',
      // 400 and 420 for the front, 300 and 310 for either side.
      moulding({ form: 'polygon', sides_mm: [300, 400, 300], turns_degrees: [90, 90], closed: false }),
      4100 + 2 * 3050,
    ],
    [
      'into a re-entrant corner',
      moulding({ form: 'polygon', sides_mm: [300, 300], turns_degrees: [-90], closed: false }),
      2 * 2950,
    ],
    // Circles of 110 and 100.
    ['round a disc', moulding({ form: 'arc', radius_mm: 100, angle_degrees: 360 }), 6597.3446],
    ['round the inside of a circle', moulding({ form: 'arc', radius_mm: 100, angle_degrees: 360 }, inward), 5969.026],
    ['round a half-round end', moulding({ form: 'arc', radius_mm: 100, angle_degrees: 180 }), 3298.6723],
    // Perimeter 484.42241 (exact integral) × 10, and the disc of 10 that closes the corners (Steiner).
    ['round an oval', moulding({ form: 'ellipse', length_mm: 200, width_mm: 100 }), 4844.2241 + 314.1593],
    [
      'round a hexagon of side 100',
      // Six rectangles of 100 × 10 and six kites at the corners, 10²·tan 30° each.
      moulding({
        form: 'polygon',
        sides_mm: [100, 100, 100, 100, 100, 100],
        turns_degrees: [60, 60, 60, 60, 60, 60],
        closed: true,
      }),
      6346.4102,
    ],
  ])('%s', (_what, shape, area_mm2) => {
    expect(surfaceOf(shape).area_mm2).toBeCloseTo(area_mm2, 3);
  });

  it('runs a half-round round a disc as half a ring of round section turned outwards', () => {
    // The outer half of a torus of radii R = 100 and r = 10: 2π²Rr + 4πr².
    const bead: ProfileElement = { id: 'bead', element: 'bead', height_mm: 20, projection_mm: 10, going: 'out' };
    const shape = moulding({ form: 'arc', radius_mm: 100, angle_degrees: 360 }, { profile: [bead] });
    expect(surfaceOf(shape).area_mm2).toBeCloseTo(20_995.846, 2);
  });

  it('counts a fillet by its face and a step only when it is drawn as a line', () => {
    const fillet: ProfileElement = { id: 'a', element: 'fillet', height_mm: 12, projection_mm: 5, going: 'out' };
    const straight: MouldingPlan = { form: 'straight', sides_mm: [1000], returns_mm: [] };
    expect(surfaceOf(moulding(straight, { profile: [fillet] })).girth_mm).toBe(12);
    expect(surfaceOf(moulding(straight, { profile: [step, fillet] })).girth_mm).toBe(22);
  });

  it('stands a fillet’s face as far out as its step, drawn or not', () => {
    const fillet: ProfileElement = { id: 'a', element: 'fillet', height_mm: 20, projection_mm: 10, going: 'out' };
    // The face goes round 420 by 320.
    expect(surfaceOf(moulding(rectangle, { profile: [fillet] })).area_mm2).toBeCloseTo(1480 * 20, 9);
  });

  it('gives every element its own part, at its own run', () => {
    const face: ProfileElement = { id: 'face', element: 'fillet', height_mm: 20, projection_mm: 0, going: 'out' };
    const [flat, upright] = surfaceOf(moulding(rectangle, { profile: [step, face] })).parts;
    expect(flat).toMatchObject({ key: 'step', element: 'line', girth_mm: 10 });
    expect(flat.area_mm2).toBeCloseTo(14_400, 9);
    expect(upright).toMatchObject({ key: 'face', element: 'fillet', girth_mm: 20 });
    expect(upright.area_mm2).toBeCloseTo(29_600, 9);
  });

  it('gives the sides it is planned by, returns among them', () => {
    const returned = surfaceOf(moulding({ form: 'straight', sides_mm: [500, 300], returns_mm: [40, 40] }));
    expect(returned.sides_mm).toEqual([510, 300, 45, 45]);
    expect(returned.closedRun).toBe(false);
    const framed = surfaceOf(moulding(rectangle));
    expect(framed.sides_mm).toEqual([410, 310, 410, 310]);
    expect(framed.closedRun).toBe(true);
  });

  it('says which edge its plan was measured at', () => {
    const reasons = surfaceOf(moulding(rectangle, { measuredAt: 'front' })).reasons;
    expect(reasons.find(({ code }) => code === 'measure-plan-run')?.values).toEqual({ offset_mm: 5, edge: 'front' });
  });

  it('has no surface without a girth or a run', () => {
    const bare: ProfileElement = { ...step, across_mm: 0 };
    expect(surfaceOf(moulding(rectangle, { profile: [bare] })).area_mm2).toBe(0);
    expect(surfaceOf(moulding({ form: 'straight', sides_mm: [0], returns_mm: [] })).area_mm2).toBe(0);
  });
});
