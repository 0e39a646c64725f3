import type * as z from 'zod';
import { measureCardSchema } from '#shared/measure/measure-card-schema';
import type { MeasureCard } from '#shared/measure/measure-card';
import type { Opening } from '#shared/measure/opening';
import type { openingSchema } from '#shared/measure/opening-schema';
import { shapeKinds, type Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { shapeSchema } from '#shared/measure/shape-schema';
import { startMeasure } from '#shared/measure/start-measure';
import type { ZoneTake } from '#shared/measure/zone-take';
import type { zoneTakeSchema } from '#shared/measure/zone-take-schema';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';

type Frozen<Value> = Value extends object ? { readonly [Key in keyof Value]: Frozen<Value[Key]> } : Value;
type Same<One, Other> = (<T>() => T extends One ? 1 : 2) extends <T>() => T extends Other ? 1 : 2 ? true : false;

// Each is a compile error as soon as a schema and its type differ by a single key.
const agreed: readonly true[] = [
  true satisfies Same<Frozen<z.infer<typeof shapeSchema>>, Frozen<Shape>>,
  true satisfies Same<Frozen<z.infer<typeof openingSchema>>, Frozen<Opening>>,
  true satisfies Same<Frozen<z.infer<typeof zoneTakeSchema>>, Frozen<ZoneTake>>,
  true satisfies Same<Frozen<z.infer<typeof measureCardSchema>>, Frozen<MeasureCard>>,
];

/** Complaints about a shape as `path: code`. */
function complaints(shape: unknown): string[] {
  const { error } = readBy(shapeSchema, shape);
  return error ? complaintsOf(error).map(({ path, code }) => `${path.join('.')}: ${code}`) : [];
}

const changed = (kind: Shape['kind'], more: object) => ({ ...shapeDefaults(kind), ...more });
const corners = (...pairs: [number, number][]) => pairs.map(([x_mm, y_mm]) => ({ x_mm, y_mm }));
const square = { form: 'polygon', sides_mm: [9, 9, 9, 9], turns_degrees: [90, 90, 90, 90], closed: true };

describe('The schema of a shape', () => {
  it('is the type of a shape, key by key', () => {
    expect(agreed).toHaveLength(4);
  });

  it.each(shapeKinds.filter((kind) => kind !== 'measured'))('takes a new %s as it is offered', (kind) => {
    expect(complaints(shapeDefaults(kind))).toEqual([]);
  });

  it('asks a measured area for its note alone', () => {
    expect(complaints(shapeDefaults('measured'))).toEqual(['note: entry-missing']);
    expect(complaints(changed('measured', { note: 'strips of paper' }))).toEqual([]);
  });

  it('gives back what it was given', () => {
    const shape = shapeDefaults('moulding');
    expect(shapeSchema.parse(shape)).toEqual(shape);
  });

  it.each<[string, unknown, string[]]>([
    ['no kind', { length_mm: 3 }, ['kind: entry-not-offered']],
    ['an unknown kind', { kind: 'pyramid' }, ['kind: entry-not-offered']],
    ['a missing length', { kind: 'sphere' }, ['diameter_mm: entry-missing']],
    ['a negative length', { kind: 'sphere', diameter_mm: -1 }, ['diameter_mm: entry-too-small']],
    ['a length of a hundred metres', { kind: 'sphere', diameter_mm: 1e5 }, ['diameter_mm: entry-not-below']],
    ['a key that is not known', { kind: 'sphere', diameter_mm: 1, colour: 'gold' }, ['colour: entry-unknown']],
    ['a negative girth', changed('cabriole', { girths_mm: [100, -5, 90] }), ['girths_mm.1: entry-too-small']],
    ['an even number of girths', changed('cabriole', { girths_mm: [9, 9, 9, 9] }), ['girths_mm: shape-girths-even']],
    ['a single girth', changed('cabriole', { girths_mm: [9] }), ['girths_mm: entry-too-few']],
    [
      'stations out of order',
      changed('stations', {
        stations: [
          { at_mm: 0, girth_mm: 9 },
          { at_mm: 20, girth_mm: 9 },
          { at_mm: 20, girth_mm: 9 },
          { at_mm: 10, girth_mm: 9 },
        ],
      }),
      ['stations.2.at_mm: shape-stations-order', 'stations.3.at_mm: shape-stations-order'],
    ],
    [
      'a ring without a width',
      changed('ring', { outerDiameter_mm: 50, innerDiameter_mm: 50 }),
      ['innerDiameter_mm: shape-ring-inside-out'],
    ],
    [
      'a polygon that crosses itself',
      changed('polygon', { points: corners([0, 0], [9, 9], [9, 0], [0, 9]) }),
      ['points: shape-crosses-itself'],
    ],
    ['a polygon of two corners', changed('polygon', { points: corners([0, 0], [9, 9]) }), ['points: entry-too-few']],
    [
      'an element’s mark used twice',
      changed('turned', {
        profile: [
          { id: 'a', element: 'line', across_mm: 0, up_mm: 5 },
          { id: 'a', element: 'line', across_mm: 0, up_mm: 5 },
        ],
      }),
      ['profile.1.id: shape-element-twice'],
    ],
    [
      'a scotia that projects more than it is high',
      changed('turned', {
        profile: [{ id: 'a', element: 'scotia', height_mm: 10, projection_mm: 11, going: 'out' }],
      }),
      ['profile.0.projection_mm: shape-scotia-too-deep'],
    ],
    [
      'an arc that rises out of nothing',
      changed('turned', { profile: [{ id: 'a', element: 'arc', across_mm: 0, up_mm: 0, bow_mm: 3 }] }),
      ['profile.0.bow_mm: shape-arc-too-bowed'],
    ],
    [
      'a turned profile through its axis',
      changed('turned', { radius_mm: 4, profile: [{ id: 'a', element: 'line', across_mm: -5, up_mm: 5 }] }),
      ['radius_mm: shape-turned-past-axis'],
    ],
    [
      'more returns than ends',
      changed('moulding', { plan: { form: 'straight', sides_mm: [900], returns_mm: [30, 30, 30] } }),
      ['plan.returns_mm: shape-returns-many'],
    ],
    [
      'a closed plan with a mitre missing',
      changed('moulding', { plan: { ...square, turns_degrees: [90, 90, 90] } }),
      ['plan.turns_degrees: shape-turns-count'],
    ],
    [
      'an open plan with one too many',
      changed('moulding', { plan: { ...square, closed: false } }),
      ['plan.turns_degrees: shape-turns-count'],
    ],
    [
      'a closed plan that does not turn once round',
      changed('moulding', { plan: { ...square, turns_degrees: [90, 90, 90, 80] } }),
      ['plan.turns_degrees: shape-turns-sum'],
    ],
    [
      'a frame smaller than its moulding',
      changed('moulding', { plan: square, facing: 'inward' }),
      ['plan: shape-plan-too-tight'],
    ],
    [
      'a sweep inside a radius smaller than its moulding',
      changed('moulding', { plan: { form: 'arc', radius_mm: 20, angle_degrees: 90 }, facing: 'inward' }),
      ['plan: shape-plan-too-tight'],
    ],
    [
      'an oval too sharp at its ends for a moulding inside it',
      changed('moulding', { plan: { form: 'ellipse', length_mm: 900, width_mm: 100 }, facing: 'inward' }),
      ['plan: shape-plan-too-tight'],
    ],
    [
      'lobes that meet in the middle',
      changed('twisted', { section: { outline: 'lobed', radius_mm: 10, depth_mm: 21, lobes: 3 } }),
      ['section.depth_mm: shape-lobes-too-deep'],
    ],
    [
      'half a lobe',
      changed('twisted', { section: { outline: 'lobed', radius_mm: 10, depth_mm: 2, lobes: 1.5 } }),
      ['section.lobes: entry-not-whole'],
    ],
    [
      'a core wider than its ribbon',
      changed('helicoid', { coreRadius_mm: 50 }),
      ['coreRadius_mm: shape-core-too-wide'],
    ],
    [
      'a ring that closes its own middle',
      changed('torus', { sectionDiameter_mm: 201 }),
      ['sectionDiameter_mm: shape-torus-too-thick'],
    ],
    [
      'a ball foot with all of it cut away',
      changed('ball-foot', { cutTop_mm: 50, cutBottom_mm: 31 }),
      ['cutBottom_mm: shape-cut-away'],
    ],
    [
      'flutes deeper than half-rounds',
      changed('cone', {
        fluting: { cut: 'flutes', width_mm: 8, depth_mm: 5, between_mm: 2, share_percent: 100 },
      }),
      ['fluting.depth_mm: shape-fluting-too-deep'],
    ],
    [
      'fluting on more than all of it',
      changed('cone', {
        fluting: { cut: 'flutes', width_mm: 8, depth_mm: 4, between_mm: 2, share_percent: 101 },
      }),
      ['fluting.share_percent: entry-too-large'],
    ],
    ['stretches of nothing', changed('band', { stretch_mm: 0 }), ['stretch_mm: entry-too-small']],
  ])('complains of %s', (_what, shape, expected) => {
    expect(complaints(shape)).toEqual(expected);
  });

  it.each(['60', Infinity, NaN, null])('refuses %j for a length', (diameter_mm) => {
    expect(complaints({ kind: 'sphere', diameter_mm })).toEqual([expect.stringMatching(/^diameter_mm: /)]);
  });

  it.each<[string, object]>([
    [
      'a frame just as large as its moulding is deep',
      { plan: { ...square, sides_mm: [46, 46, 46, 46] }, facing: 'inward' },
    ],
    ['the same small box with its moulding outside', { plan: square, facing: 'outward' }],
    ['mitres read off a bevel, a quarter of a degree out', { plan: { ...square, turns_degrees: [90, 90.25, 90, 90] } }],
  ])('allows %s', (_what, more) => {
    expect(complaints(changed('moulding', more))).toEqual([]);
  });
});

describe('The schema of what a card says about measuring', () => {
  it('takes the start values, and no factor below 1', () => {
    expect(measureCardSchema.parse(startMeasure)).toEqual(startMeasure);
    const { error } = measureCardSchema.safeParse({
      ...startMeasure,
      reliefFactors: { ...startMeasure.reliefFactors, low: 0.9 },
    });
    expect(error && complaintsOf(error).map(({ path }) => path.join('.'))).toEqual(['reliefFactors.low']);
  });
});
