import fc from 'fast-check';
import type { Fluting } from '#shared/measure/fluting';
import { mirrored } from '#shared/measure/mirrored';
import { mirroredProfile } from '#shared/measure/mirrored-profile';
import type { MouldingPlan, MouldingShape } from '#shared/measure/moulding-shape';
import { classicalMembers, type ProfileElement } from '#shared/measure/profile-element';
import type { Shape } from '#shared/measure/shape';
import { shapeKinds } from '#shared/measure/shape';
import { shapeComplaints } from '#shared/measure/shape-complaints';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { surfaceOf } from '#shared/measure/surface-of';

/** Every length of a shape changed by a factor (areas by its square), each by its own or all by one. */
function changed<Value>(value: Value, factor: () => number, name = ''): Value {
  if (typeof value === 'number') {
    if (name.endsWith('_mm2')) return (value * factor() ** 2) as Value;
    return (name.endsWith('_mm') ? value * factor() : value) as Value;
  }
  if (Array.isArray(value)) return value.map((item: unknown) => changed(item, factor, name)) as Value;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value).map(([key, item]: [string, unknown]) => [key, changed(item, factor, key)]),
  ) as Value;
}

const scaled = (shape: Shape, factor: number) => changed(shape, () => factor);

const size = fc.double({ min: 0.5, max: 60, noNaN: true });
const element = fc.record({
  element: fc.constantFrom(...classicalMembers),
  height: size,
  part: fc.double({ min: 0, max: 1, noNaN: true }),
  going: fc.constantFrom('out' as const, 'in' as const),
});
const profile = fc.array(element, { minLength: 1, maxLength: 6 }).map((members) =>
  members.map(({ element: name, height, part, going }, index): ProfileElement => ({
    id: `e${index}`,
    element: name,
    height_mm: height,
    projection_mm: height * part,
    going,
  })),
);
/** Whole thousandths: what stands closer together than anybody measures loses its figures by subtraction. */
const factor = fc.integer({ min: 700, max: 1400 }).map((thousandths) => thousandths / 1000);
const factors = fc.array(factor, { minLength: 20, maxLength: 20 });

const plan = fc.constantFrom<MouldingPlan>(
  { form: 'straight', sides_mm: [900, 500], returns_mm: [200, 150, 300] },
  { form: 'arc', radius_mm: 600, angle_degrees: 120 },
  { form: 'ellipse', length_mm: 1200, width_mm: 1000 },
  { form: 'polygon', sides_mm: [700, 400, 800], turns_degrees: [45, -60], closed: false },
  { form: 'polygon', sides_mm: [500, 600, 700, 800, 900], turns_degrees: [100, 30, 50, 110, 70], closed: true },
);
const edge = fc.record({
  measuredAt: fc.constantFrom('back' as const, 'front' as const),
  facing: fc.constantFrom('outward' as const, 'inward' as const),
});
const fluting = fc.option(
  fc.constant<Fluting>({ cut: 'flutes', width_mm: 8, depth_mm: 2, between_mm: 3, share_percent: 60 }),
  { nil: undefined },
);

/** Possible shapes of every kind, those with a profile of any profile. */
const possible = fc
  .record({ kind: fc.constantFrom(...shapeKinds), each: factors, elements: profile, plan, edge, fluting })
  .map((drawn): Shape => {
    const { each, elements } = drawn;
    let used = 0;
    const shape = changed(shapeDefaults(drawn.kind), () => each[(used += 1) % each.length]);
    if (shape.kind === 'moulding')
      return {
        ...shape,
        ...drawn.edge,
        plan: changed(drawn.plan, () => each[0]),
        profile: elements,
        fluting: drawn.fluting,
      };
    if (shape.kind === 'turned') return { ...shape, radius_mm: 400, profile: elements, fluting: drawn.fluting };
    return 'ends' in shape ? { ...shape, ends: { top: true, bottom: false } } : shape;
  })
  .filter((shape) => shapeComplaints(shape).length === 0);

const length = fc.double({ min: 500, max: 5000, noNaN: true });
const rectangle = (elements: readonly ProfileElement[], [width, depth]: readonly [number, number]): MouldingShape => ({
  kind: 'moulding',
  profile: elements,
  plan: { form: 'polygon', sides_mm: [width, depth, width, depth], turns_degrees: [90, 90, 90, 90], closed: true },
  measuredAt: 'back',
  facing: 'outward',
});

const isNearly = (figure: number, expected: number) =>
  expect(Math.abs(figure - expected)).toBeLessThanOrEqual(1e-9 * (1 + Math.abs(expected)));

describe('Laws of a surface', () => {
  it('covers every kind there is', () => {
    expect(fc.sample(possible, 600).map(({ kind }) => kind)).toEqual(expect.arrayContaining([...shapeKinds]));
  });

  it('doubling every length gives four times the area', () => {
    fc.assert(
      fc.property(possible, (shape) => {
        isNearly(surfaceOf(scaled(shape, 2)).area_mm2, 4 * surfaceOf(shape).area_mm2);
      }),
    );
  });

  it('inches read as mm give 645.16 times the area', () => {
    fc.assert(
      fc.property(possible, (shape) => {
        isNearly(surfaceOf(scaled(shape, 25.4)).area_mm2, 645.16 * surfaceOf(shape).area_mm2);
      }),
    );
  });

  it('every length nothing gives nothing', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...shapeKinds.filter((kind) => kind !== 'polygon' && kind !== 'stations')),
        (kind) => {
          expect(surfaceOf(scaled(shapeDefaults(kind), 0)).area_mm2).toBe(0);
        },
      ),
    );
  });

  it('parts add up to the girth and to the area', () => {
    fc.assert(
      fc.property(possible, (shape) => {
        const { parts, girth_mm, area_mm2 } = surfaceOf(shape);
        if (parts.length === 0) return;
        isNearly(
          parts.reduce((sum, part) => sum + part.girth_mm, 0),
          girth_mm ?? NaN,
        );
        isNearly(
          parts.reduce((sum, part) => sum + part.area_mm2, 0),
          area_mm2,
        );
      }),
    );
  });

  it('girth by run, with the ends, is the area, and the sides add up to the run', () => {
    fc.assert(
      fc.property(possible, (shape) => {
        const { area_mm2, girth_mm, run_mm, ends_mm2 = 0, sides_mm } = surfaceOf(shape);
        if (girth_mm === undefined || run_mm === undefined) return;
        isNearly(girth_mm * run_mm + ends_mm2, area_mm2);
        isNearly(
          sides_mm.reduce((sum, side_mm) => sum + side_mm, 0),
          run_mm,
        );
      }),
    );
  });

  it('one more element on a straight moulding never gives less', () => {
    fc.assert(
      fc.property(profile, length, (elements, run_mm) => {
        const along = (some: readonly ProfileElement[]): Shape => ({
          ...rectangle(some, [1, 1]),
          plan: { form: 'straight', sides_mm: [run_mm], returns_mm: [] },
        });
        const areas = elements.map((_, index) => surfaceOf(along(elements.slice(0, index + 1))).area_mm2);
        expect(areas).toEqual([...areas].sort((a, b) => a - b));
      }),
    );
  });

  it('a box measured at the back is the same box measured over the front, twice the projection longer each way', () => {
    fc.assert(
      fc.property(profile, length, length, (elements, width, depth) => {
        const back = rectangle(elements, [width, depth]);
        const run = surfaceOf(back).reasons.find(({ code }) => code === 'measure-plan-run');
        const overFront = surfaceOf({ ...back, measuredAt: 'front' }).reasons.find(
          ({ code }) => code === 'measure-plan-run',
        );
        // How deep the profile is, from its two distances to the middle of its curve.
        const projection = Number(run?.values['offset_mm']) + Number(overFront?.values['offset_mm']);
        const front = rectangle(elements, [width + 2 * projection, depth + 2 * projection]);
        isNearly(surfaceOf({ ...front, measuredAt: 'front' }).area_mm2, surfaceOf(back).area_mm2);
      }),
    );
  });

  it('the corners of a closed run turn once round: any convex plan gains the same as a circle at least', () => {
    fc.assert(
      fc.property(fc.integer({ min: 3, max: 40 }), (corners) => {
        const step: ProfileElement = { id: 'a', element: 'line', across_mm: 10, up_mm: 0 };
        const plan = {
          form: 'polygon',
          sides_mm: Array<number>(corners).fill(200),
          turns_degrees: Array<number>(corners).fill(360 / corners),
          closed: true,
        } as const;
        const gained = (surfaceOf({ ...rectangle([step], [1, 1]), plan }).run_mm ?? 0) - 200 * corners;
        // 2π × 5 for a circle; mitres always reach a little further.
        expect(gained).toBeGreaterThan(31.4159);
        expect(gained).toBeLessThan(52);
      }),
    );
  });

  it('the other hand has the same surface, and its other hand is the first again', () => {
    fc.assert(
      fc.property(possible, (shape) => {
        isNearly(surfaceOf(mirrored(shape)).area_mm2, surfaceOf(shape).area_mm2);
        expect(mirrored(mirrored(shape))).toEqual(shape);
      }),
    );
  });

  it('a profile upside down has the same girth, round a box too', () => {
    fc.assert(
      fc.property(profile, length, length, (elements, width, depth) => {
        const upright = surfaceOf(rectangle(elements, [width, depth]));
        const turned = surfaceOf(rectangle(mirroredProfile(elements), [width, depth]));
        isNearly(turned.girth_mm ?? NaN, upright.girth_mm ?? 0);
        isNearly(turned.area_mm2, upright.area_mm2);
      }),
    );
  });
});
