import icosphere from 'icosphere';
import { ellipsePerimeter } from '#shared/geometry/ellipse-perimeter';
import { meshArea } from '#shared/geometry/mesh-area';
import { planeMapping } from '#shared/geometry/plane-mapping';
import { polygonArea } from '#shared/geometry/polygon';
import { revolvedArea } from '#shared/geometry/revolved-area';
import { spheroidZoneArea } from '#shared/geometry/spheroid-zone-area';
import { bandStretches } from '#shared/measure/band-stretches';
import { flutingFactor } from '#shared/measure/fluting-factor';
import { paidQuantity } from '#shared/measure/paid-quantity';
import type { ClassicalMember, ProfileElement } from '#shared/measure/profile-element';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';

const inch = 25.4;
const foot = 12 * inch;
const yard = 3 * foot;
const noEnds = { top: false, bottom: false };
const areaOf = (shape: Shape) => surfaceOf(shape).area_mm2;

const straight = (element: ProfileElement, run_mm = 1000): Shape => ({
  kind: 'moulding',
  profile: [element],
  plan: { form: 'straight', sides_mm: [run_mm], returns_mm: [] },
  measuredAt: 'back',
  facing: 'outward',
});

describe('Mensuration, Building Trades Pocketbook (International Correspondence Schools)', () => {
  it('S1: the side of a frustum of radii 6 and 3, height 4', () => {
    const frustum: Shape = { kind: 'cone', bottomDiameter_mm: 12, topDiameter_mm: 6, height_mm: 4, ends: noEnds };
    expect(Math.abs(areaOf(frustum) - 141.3717)).toBeLessThan(1e-4);
  });

  it('S2: a torus of radii 3 and 1', () => {
    expect(Math.abs(areaOf({ kind: 'torus', centreDiameter_mm: 6, sectionDiameter_mm: 2 }) - 118.4353)).toBeLessThan(
      1e-4,
    );
  });

  it('S2: the zone of a sphere of radius 5, height 2, wherever it is taken (standard)', () => {
    for (const low of [-5, -1, 0.5, 3])
      expect(Math.abs(spheroidZoneArea({ radius: 5, halfHeight: 5 }, [low, low + 2]) - 62.8319)).toBeLessThan(1e-4);
    const foot: Shape = { kind: 'ball-foot', diameter_mm: 10, cutTop_mm: 3, cutBottom_mm: 5, ends: noEnds };
    expect(Math.abs(areaOf(foot) - 62.8319)).toBeLessThan(1e-4);
  });

  // Heights as printed there for the Roman mouldings; a torus is a half-round, a scotia may share its height anyhow.
  it.each<[ClassicalMember, number]>([
    ['ovolo', 30],
    ['cavetto', 30],
    ['cyma-recta', 30],
    ['cyma-reversa', 30],
    ['scotia', 0],
    ['scotia', 10],
    ['scotia', 30],
    ['torus', 15],
  ])('S5: the girth of a Roman %s 30 mm high, projecting %d mm', (element, projection_mm) => {
    for (const going of ['out', 'in'] as const) {
      const girth_mm = surfaceOf(straight({ id: 'a', element, height_mm: 30, projection_mm, going })).girth_mm;
      expect(Math.abs((girth_mm ?? 0) - 47.1239)).toBeLessThan(1e-4);
    }
  });
});

describe('Standard figures', () => {
  // The exact integral, to the digits printed; Ramanujan's second formula misses the second by 1.2e-5.
  it.each([
    [10, 5, 48.442241],
    [10, 1, 40.639742],
  ])('S3: the perimeter of an ellipse of semi-axes %d and %d', (a, b, perimeter) => {
    expect(Math.abs(ellipsePerimeter(a, b) - perimeter)).toBeLessThan(1e-6);
  });

  it('S4: y = x³ from 0 to 1 turned about x, by Simpson on 200 intervals (calculus text)', () => {
    const cubic = { radiusAt: (x: number) => x ** 3, slopeAt: (x: number) => 3 * x * x };
    expect(Math.abs(revolvedArea(cubic, [0, 1], 200) - 3.5631219)).toBeLessThan(3e-6);
  });

  it('S5: a flat cyma girths π/3 of its chord (Nicholson’s construction; own arithmetic)', () => {
    // A chord of 50 from a height of 40 and a projection of 30.
    const cyma = straight({ id: 'a', element: 'flat-cyma', height_mm: 40, projection_mm: 30, going: 'out' });
    expect(Math.abs((surfaceOf(cyma).girth_mm ?? 0) - 52.359878)).toBeLessThan(1e-6);
  });

  it('S6: half-round reeds side by side, and V grooves at 45° (geometry; own)', () => {
    const side = { between_mm: 0, share_percent: 100, width_mm: 8, depth_mm: 4 };
    expect(Math.abs(flutingFactor({ cut: 'reeds', ...side }) - 1.5708)).toBeLessThan(1e-4);
    expect(Math.abs(flutingFactor({ cut: 'v-grooves', ...side }) - 1.4142)).toBeLessThan(1e-4);
  });

  it.each([
    [0.25, 1.0625],
    [0.5, 1.25],
    [1, 2],
  ])('S7: a spherical boss as high as %d of its radius has %d times its plan (geometry; own)', (part, ratio) => {
    const boss: Shape = { kind: 'boss', diameter_mm: 80, height_mm: 40 * part };
    const plan: Shape = { kind: 'circle', diameter_mm: 80 };
    expect(Math.abs(areaOf(boss) / areaOf(plan) - ratio)).toBeLessThan(1e-9);
  });

  it('S8: one turn of a helicoid of radius 1 that rises 1 a radian (standard, from memory; own number)', () => {
    const helicoid: Shape = {
      kind: 'helicoid',
      radius_mm: 1,
      coreRadius_mm: 0,
      risePerTurn_mm: 2 * Math.PI,
      turns: 1,
      hand: 'right',
    };
    expect(Math.abs(areaOf(helicoid) - 7.2118)).toBeLessThan(1e-6);
  });

  it('S9: the polygon of Rosetta Code’s shoelace task', () => {
    const corners = [
      [3, 4],
      [5, 11],
      [12, 8],
      [9, 5],
      [5, 6],
    ];
    expect(polygonArea(corners.map(([x, y]) => ({ x, y })))).toBe(30);
    expect(areaOf({ kind: 'polygon', points: corners.map(([x_mm, y_mm]) => ({ x_mm, y_mm })) })).toBe(30);
  });

  it('S10: the plane mapping in the README of npm perspective-transform 1.1.3', () => {
    const mapping = planeMapping(
      [
        { x: 158, y: 64 },
        { x: 494, y: 69 },
        { x: 495, y: 404 },
        { x: 158, y: 404 },
      ],
      [
        { x: 100, y: 500 },
        { x: 152, y: 564 },
        { x: 148, y: 604 },
        { x: 100, y: 560 },
      ],
    );
    const mapped = mapping?.({ x: 250, y: 120 });
    expect(Math.abs((mapped?.x ?? 0) - 117.27521)).toBeLessThan(1e-4);
    expect(Math.abs((mapped?.y ?? 0) - 530.92024)).toBeLessThan(1e-4);
  });

  it.each([
    [0, 9.574541],
    [1, 11.665931],
    [2, 12.329063],
    [3, 12.506175],
  ])('S11: the mesh of npm icosphere 1.0.0 at level %d', (level, area) => {
    const { positions, cells } = icosphere(level);
    expect(Math.abs(meshArea(positions, cells) - area)).toBeLessThan(1e-6);
  });

  it('S12: doubling every length gives four times the area; inches to mm 645.16 times', () => {
    const leg = (scale: number): Shape => ({
      kind: 'straight-leg',
      section: 'octagonal',
      length_mm: 30 * scale,
      top_mm: 3 * scale,
      foot_mm: 2 * scale,
      ends: { top: true, bottom: true },
    });
    expect(areaOf(leg(2)) / areaOf(leg(1))).toBeCloseTo(4, 12);
    expect(areaOf(leg(25.4)) / areaOf(leg(1))).toBeCloseTo(645.16, 9);
    const panel = (scale: number): Shape => ({ kind: 'rectangle', length_mm: 12 * scale, height_mm: 7 * scale });
    expect(areaOf(panel(2))).toBe(4 * areaOf(panel(1)));
  });
});

describe('A rim unrolled (common practice, no source)', () => {
  const band = {
    kind: 'band',
    length: { by: 'tape', length_mm: 247 * inch },
    height_mm: 12 * inch,
    closed: false,
    stretch_mm: 48 * inch,
  } as const;

  it('12 in by 247 in is 2,964 in²', () => {
    expect(areaOf(band) / inch ** 2).toBeCloseTo(2964, 9);
  });

  it('is cut into five stretches of 48 in and one of 7 in', () => {
    const { whole, rest_mm } = bandStretches(band);
    expect(whole).toBe(5);
    expect(rest_mm / inch).toBeCloseTo(7, 9);
  });
});

describe('Measuring rules: quantities that are paid for', () => {
  it('M1: four lengths of 12 ft by 3 in at 4 d a square foot: 12 ft², 48 d, 4 s (A Key to Civil Architecture, 1774)', () => {
    const measures = [{ count: 4, length_mm: 12 * foot, girth_mm: 3 * inch }];
    const quantity_ft2 = paidQuantity({ rule: 'plain-area', measures }).quantity_mm2 / foot ** 2;
    expect(quantity_ft2).toBeCloseTo(12, 9);
    expect(quantity_ft2 * 4).toBeCloseTo(48, 9);
  });

  it('M2: carved work at 2.00 times, each side (IS 1200 Part 15)', () => {
    const carved = (sides: 1 | 2) =>
      paidQuantity({ rule: 'carved-each-side', measures: [{ count: 1, area_mm2: 5e5, sides }] }).quantity_mm2;
    expect([carved(1), carved(2)]).toEqual([1e6, 2e6]);
  });

  // An Old Hand, Hints for Painters.
  it.each([
    [4.5, 6],
    [5.99, 6],
    [6, 12],
    [11.9, 12],
    [12, 12],
    [14.5, 14.5],
  ])('M3: a member girthing %d in counts as %d in', (girth, paid) => {
    const measures = [{ count: 1, length_mm: 10 * foot, girth_mm: girth * inch }];
    expect(paidQuantity({ rule: 'narrow-girth', measures }).quantity_mm2 / foot ** 2).toBeCloseTo((paid / 12) * 10, 9);
  });

  it('M4: 600 yd plain and 300 yd special at 0.20 come to 180.00 (White)', () => {
    const measures = [600, 300].map((yards) => ({ count: 1, area_mm2: yards * yard ** 2, worth: 1 }));
    expect((paidQuantity({ rule: 'weighted', measures }).quantity_mm2 / yard ** 2) * 0.2).toBeCloseTo(180, 9);
  });

  it('M4: 60 yd worth three times plain add 120 yd (White)', () => {
    const plain = { count: 1, area_mm2: 60 * yard ** 2, worth: 1 };
    const worked = paidQuantity({ rule: 'weighted', measures: [{ ...plain, worth: 3 }] });
    expect((worked.quantity_mm2 - plain.area_mm2) / yard ** 2).toBeCloseTo(120, 9);
  });
});
