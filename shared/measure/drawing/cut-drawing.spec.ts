import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { Fluting } from '#shared/measure/fluting';
import type { Shape, ShapeKind } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';

const flutes: Fluting = { cut: 'flutes', width_mm: 8, depth_mm: 4, between_mm: 3, share_percent: 100 };
const cut = (kind: ShapeKind, change: object = {}, fluting: Partial<Fluting> = {}) =>
  memberDrawing({ ...shapeDefaults(kind), ...change, fluting: { ...flutes, ...fluting } } as Shape).views;
const edges = (kind: ShapeKind, change: object = {}, fluting: Partial<Fluting> = {}) =>
  cut(kind, change, fluting)[0].paths.filter((path) => path.kind === 'cut').length;
const outline = (view: ReturnType<typeof cut>[number]) => view.paths.find(({ kind }) => kind === 'outline')?.data ?? '';
const arcs = (data: string) => [...data.matchAll(/A (\S+) \S+ 0 [01] ([01])/g)].map(([, radius, way]) => [radius, way]);
const round = { section: 'round', top_mm: 70, foot_mm: 70 };
const square = { section: 'square', top_mm: 41, foot_mm: 41 };

const fluted: readonly ShapeKind[] = [
  'rectangle',
  'moulding',
  'turned',
  'straight-leg',
  'cabriole',
  'stations',
  'twisted',
  'cone',
  'band',
];
const grammar = /^M -?[\d.]+ -?[\d.]+( [ML] -?[\d.]+ -?[\d.]+| A [\d.]+ [\d.]+ 0 [01] [01] -?[\d.]+ -?[\d.]+| Z)*$/;

describe('Flutes on a drawing', () => {
  it.each(fluted.flatMap((kind) => (['flutes', 'reeds', 'v-grooves'] as const).map((way) => [kind, way] as const)))(
    'of a %s, cut as %s, stay within its box',
    (kind, way) => {
      for (const { paths, box } of cut(kind, {}, { cut: way }))
        for (const { data } of paths) {
          expect(data).toMatch(grammar);
          for (const [, x, y] of data.matchAll(/(?:[ML]|A \S+ \S+ 0 [01] [01]) (\S+) (\S+)/g)) {
            expect(Number(x)).toBeGreaterThanOrEqual(box.left_mm - 1e-3);
            expect(Number(x)).toBeLessThanOrEqual(box.left_mm + box.width_mm + 1e-3);
            expect(Number(y)).toBeGreaterThanOrEqual(box.top_mm - 1e-3);
            expect(Number(y)).toBeLessThanOrEqual(box.top_mm + box.height_mm + 1e-3);
          }
        }
    },
  );

  it.each<[string, ShapeKind, object, Partial<Fluting>, number]>([
    // 54 × 8 + 53 × 3 = 591 mm go into 600 mm, 55 would take 602 mm; each has two edges.
    ['as many as find room across a frieze', 'rectangle', {}, {}, 108],
    // 27 × 8 + 26 × 3 = 294 mm go into the half of it.
    ['as many as find room in their share', 'rectangle', {}, { share_percent: 50 }, 54],
    ['edges once where reeds touch', 'rectangle', { length_mm: 80 }, { cut: 'reeds', between_mm: 0 }, 11],
    ['the bottom of a V besides', 'rectangle', { length_mm: 80 }, { cut: 'v-grooves', between_mm: 0 }, 21],
    ['four on the face of a leg of 41 mm', 'straight-leg', square, {}, 8],
    ['none where one finds no room', 'rectangle', { length_mm: 7 }, {}, 0],
    ['none without a width', 'rectangle', {}, { width_mm: 0, between_mm: 0 }, 0],
  ])('are %s', (_, kind, change, fluting, count) => {
    expect(edges(kind, change, fluting)).toBe(count);
  });

  it('stand round a leg as near to their spacing as whole ones come', () => {
    // π × 70 mm / 11 mm = 19.99.
    expect(arcs(outline(cut('straight-leg', round)[1]))).toHaveLength(20);
    // Half of forty edges are in front, the two at the sides are the outline itself or behind it.
    expect(edges('straight-leg', round)).toBe(20);
  });

  it('are let into the plan of a leg as half-rounds, reeds stand out from it', () => {
    const [, flutedPlan] = cut('straight-leg', square);
    // Four to each of four sides, 8 mm wide and 4 mm deep: radius 4 mm.
    expect(arcs(outline(flutedPlan))).toEqual(Array<string[]>(16).fill(['4', '0']));
    const [, reeded] = cut('straight-leg', square, { cut: 'reeds' });
    expect(arcs(outline(reeded))).toEqual(Array<string[]>(16).fill(['4', '1']));
    expect(reeded.box.width_mm).toBe(49);
    expect(flutedPlan.box.width_mm).toBe(41);
  });

  it('are seen in the section of a moulding where an element has room for one', () => {
    const [section] = cut('moulding', {}, { width_mm: 4, depth_mm: 2, between_mm: 2 });
    const cuts = section.paths.filter(({ kind }) => kind === 'outline').map(({ data }) => arcs(data).length);
    // A fillet of 5 mm takes one; the quarter-round of 20 mm is 31.4 mm long: (31.4 + 2) / 6 = 5.6.
    expect(cuts).toEqual([1, 5, 1]);
  });

  it('run up a turned piece and follow its profile', () => {
    const [view] = cut('turned');
    const lines = view.paths.filter(({ kind }) => kind === 'cut');
    expect(lines.length).toBeGreaterThan(0);
    expect(lines.some(({ data }) => data.split('L').length > 20)).toBe(true);
  });
});
