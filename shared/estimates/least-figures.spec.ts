import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Member, MemberContent } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { memberContentSchema } from '#shared/estimates/member-schema';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { shapeKinds, type ShapeKind } from '#shared/measure/shape';
import { startCard } from '#shared/rate-cards/start-card';

/** Whatever figure next to nothing a schema lets through, an estimate is worked with it. */
const id = (last: number): string => `00000000-0000-4000-8000-00000000000${last}`;

const memberOf = (kind: ShapeKind): MemberContent => {
  const { id: _, ...content } = memberForSpecs({
    pieceId: id(1),
    shape: shapeDefaults(kind),
    zones: [zoneEntryForSpecs({ id: id(2), relief: 'middle', painted_percent: 5, protectedEdge_mm: 100 })],
    ornaments: [
      ornamentForSpecs({ id: id(3), size_mm: 60, zoneId: id(2) }),
      ornamentForSpecs({
        ...{ id: id(4), ornamentId: 'egg-and-dart', size_mm: 40, zoneId: id(2) },
        extent: { way: 'run', run_mm: 1200, runs: 1, mitreLeaf_mm: 40, mitreLeaves: 4, centre_mm: 90 },
      }),
    ],
  });
  return content;
};

type Path = readonly (string | number)[];

const pathsOf = (value: unknown, path: Path = []): Path[] =>
  typeof value === 'number'
    ? [path]
    : typeof value === 'object' && value !== null
      ? Object.entries(value).flatMap(([name, inner]) => pathsOf(inner, [...path, name]))
      : [];

function withFigure(content: MemberContent, path: Path, figure: number): unknown {
  const copy: unknown = structuredClone(content);
  const parent = path.slice(0, -1).reduce<unknown>((at, name) => (at as Record<string, unknown>)[name], copy);
  (parent as Record<string, unknown>)[path.at(-1)!] = figure;
  return copy;
}

const work = (content: MemberContent): void => {
  const member: Member = { ...content, id: id(5), pieceId: 'piece' };
  const prepared = prepareEstimate({ draft: draftForSpecs([member]), choice: [], card: startCard, currency: 'EUR' });
  estimateFigures(prepared, null);
};

describe.each(shapeKinds)('a member of the shape %s', (kind) => {
  it.each([0, 0.001, 1e-6, 1e-12, 1e-300, 5e-324])('is worked with any figure of %d that may be entered', (figure) => {
    const content = memberOf(kind);
    const faults = pathsOf(content).flatMap((path) => {
      const read = memberContentSchema.safeParse(withFigure(content, path, figure));
      if (!read.success) return [];
      try {
        work(read.data);
        return [];
      } catch (error) {
        return [`${path.join('.')}: ${String(error)}`];
      }
    });
    expect(faults).toEqual([]);
  });
});

it.each([1e-300, 5e-324, 0.000_9])('a size of %d mm is refused where it stands', (size_mm) => {
  const content = memberOf('rectangle');
  for (const path of [
    ['ornaments', 0, 'size_mm'],
    ['shape', 'length_mm'],
    ['ornaments', 1, 'extent', 'centre_mm'],
  ]) {
    const { error } = memberContentSchema.safeParse(withFigure(content, path, size_mm));
    expect(error?.issues.map((issue) => issue.path)).toEqual([path]);
  }
});
