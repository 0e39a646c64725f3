import fc from 'fast-check';
import type { DrawingView } from '#shared/measure/drawing/drawing';
import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { classicalMembers } from '#shared/measure/profile-element';
import { shapeKinds, type Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';

const viewsOf = (shape: Shape) => memberDrawing(shape).views;
const labelsOf = (view: DrawingView) => view.dimensions.map(({ label_mm, side }) => `${side} ${Math.round(label_mm)}`);
const sizeOf = ({ box }: DrawingView) => [Math.round(box.width_mm), Math.round(box.height_mm)];

/** Every place a path names: the ends of its moves, lines and arcs. */
const placesOf = (data: string) =>
  [...data.matchAll(/(?:[ML]|A \S+ \S+ 0 [01] [01]) (\S+) (\S+)/g)].map(([, x, y]) => [Number(x), Number(y)]);

const grammar = /^M -?[\d.]+ -?[\d.]+( L -?[\d.]+ -?[\d.]+| A [\d.]+ [\d.]+ 0 [01] [01] -?[\d.]+ -?[\d.]+| Z)*$/;

const profiled = (element: (typeof classicalMembers)[number], going: 'out' | 'in'): Shape => ({
  ...(shapeDefaults('moulding') as Extract<Shape, { kind: 'moulding' }>),
  profile: [{ id: 'a', element, height_mm: 30, projection_mm: 12, going }],
});

describe('A member drawing', () => {
  it.each(shapeKinds)('of a %s is written in path data a browser and a paper read alike, within its box', (kind) => {
    const views = viewsOf(shapeDefaults(kind));
    expect(views.length).toBe(kind === 'measured' ? 0 : views.length || 1);
    for (const { paths, box } of views)
      for (const { data } of paths) {
        expect(data).toMatch(grammar);
        for (const [x, y] of placesOf(data)) {
          expect(x).toBeGreaterThanOrEqual(box.left_mm - 1e-3);
          expect(x).toBeLessThanOrEqual(box.left_mm + box.width_mm + 1e-3);
          expect(y).toBeGreaterThanOrEqual(box.top_mm - 1e-3);
          expect(y).toBeLessThanOrEqual(box.top_mm + box.height_mm + 1e-3);
        }
      }
  });

  it.each(shapeKinds)('of a %s labels its dimensions with the distances they span', (kind) => {
    for (const { dimensions } of viewsOf(shapeDefaults(kind)))
      for (const { from, to, label_mm } of dimensions)
        expect(label_mm).toBeCloseTo(Math.hypot(to.x_mm - from.x_mm, to.y_mm - from.y_mm), 6);
  });

  it.each<[string, Shape, string[], [number, number], string[]]>([
    ['a panel', { kind: 'rectangle', length_mm: 600, height_mm: 150 }, ['face'], [600, 150], ['below 600', 'left 150']],
    [
      'a ring, its hole marked above',
      { kind: 'ring', outerDiameter_mm: 300, innerDiameter_mm: 200 },
      ['face'],
      [300, 300],
      ['below 300', 'left 300', 'above 200'],
    ],
    [
      'a drawn face, moved to its corner',
      {
        kind: 'polygon',
        points: [
          { x_mm: -40, y_mm: 10 },
          { x_mm: 60, y_mm: 10 },
          { x_mm: 0, y_mm: 60 },
        ],
      },
      ['face'],
      [100, 50],
      ['below 100', 'left 50'],
    ],
    [
      'a square leg, with its plan',
      {
        kind: 'straight-leg',
        section: 'square',
        length_mm: 700,
        top_mm: 60,
        foot_mm: 40,
        ends: { top: false, bottom: false },
      },
      ['elevation', 'plan'],
      [60, 700],
      ['above 60', 'below 40', 'left 700'],
    ],
    [
      'a cut ball foot, 3-4-5 below its middle',
      {
        kind: 'ball-foot',
        diameter_mm: 100,
        cutTop_mm: 80,
        cutBottom_mm: 0,
        ends: { top: false, bottom: false },
      },
      ['elevation'],
      [80, 20],
      ['below 80', 'left 20'],
    ],
    [
      'a block: front, side and plan',
      shapeDefaults('box'),
      ['elevation', 'elevation', 'plan'],
      [200, 100],
      ['below 200', 'left 100'],
    ],
    [
      'a band in stretches, with what is left over',
      {
        kind: 'band',
        length: { by: 'tape', length_mm: 2000 },
        height_mm: 120,
        closed: false,
        stretch_mm: 600,
      },
      ['unrolled'],
      [2000, 120],
      ['below 2000', 'left 120', 'above 600', 'above 200'],
    ],
    ['a profile', profiled('ovolo', 'out'), ['profile'], [12, 30], ['below 12', 'left 30']],
    ['a scotia, hollow behind its lips', profiled('scotia', 'out'), ['profile'], [21, 30], ['below 21', 'left 30']],
  ])('of %s', (_what, shape, views, size, labels) => {
    const drawn = viewsOf(shape);
    expect(drawn.map(({ view }) => view)).toEqual(views);
    expect(sizeOf(drawn[0])).toEqual(size);
    expect(labelsOf(drawn[0])).toEqual(labels);
  });

  it('of a moulding on a box shows its plan, every side labelled outside', () => {
    const moulding = shapeDefaults('moulding') as Extract<Shape, { kind: 'moulding' }>;
    const plan = {
      form: 'polygon',
      sides_mm: [400, 300, 400, 300],
      turns_degrees: [90, 90, 90, 90],
      closed: true,
    } as const;
    const [, seen] = viewsOf({ ...moulding, plan });
    expect(sizeOf(seen)).toEqual([400, 300]);
    expect(labelsOf(seen)).toEqual(['above 400', 'right 300', 'below 400', 'left 300']);
  });

  it('of a profile labels the height of each element on the right', () => {
    const [section] = viewsOf(shapeDefaults('moulding'));
    expect(labelsOf(section).filter((label) => label.startsWith('right'))).toEqual(['right 5', 'right 20', 'right 5']);
  });

  it('draws faces that do not count in hidden lines', () => {
    const [front, , plan] = viewsOf(shapeDefaults('box'));
    expect(front.paths.map(({ kind }) => kind)).toEqual(['outline']);
    expect(plan.paths.map(({ kind }) => kind)).toEqual(['hidden']);
  });

  it('draws a turned piece alike on both sides of its axis', () => {
    const [view] = viewsOf(shapeDefaults('turned'));
    const ends = view.paths.flatMap(({ data }) => placesOf(data)).map(([x, y]) => `${Math.abs(x)} ${y}`);
    const right = view.paths.flatMap(({ data }) => placesOf(data)).filter(([x]) => x > 0).length;
    const left = view.paths.flatMap(({ data }) => placesOf(data)).filter(([x]) => x < 0).length;
    expect(right).toBe(left);
    expect(ends.length).toBeGreaterThan(10);
  });

  // Read off a drawing by eye: going out, an ovolo is walked anticlockwise on the screen, a cavetto clockwise.
  it.each([
    ['ovolo', 'M 0 0 A 12 30 0 0 0 12 -30'],
    ['cavetto', 'M 0 0 A 12 30 0 0 1 12 -30'],
    ['torus', 'M 0 0 A 12 15 0 0 0 12 -15 A 12 15 0 0 0 0 -30'],
    ['cyma-recta', 'M 0 0 A 6 15 0 0 0 6 -15 A 6 15 0 0 1 12 -30'],
    ['cyma-reversa', 'M 0 0 A 6 15 0 0 1 6 -15 A 6 15 0 0 0 12 -30'],
  ] as const)('bends a %s the right way', (element, data) => {
    expect(viewsOf(profiled(element, 'out'))[0].paths[0].data).toBe(data);
  });

  it('is as large as the shape, whatever its size', () => {
    const size = fc.integer({ min: 1, max: 99_999 });
    fc.assert(
      fc.property(size, size, (length_mm, height_mm) => {
        for (const kind of ['rectangle', 'ellipse'] as const)
          expect(sizeOf(viewsOf({ kind, length_mm, height_mm })[0])).toEqual([length_mm, height_mm]);
      }),
    );
  });
});
