import { leastWidth } from '#shared/geometry/least-width';
import { distance } from '#shared/geometry/point';
import { bandLength } from '#shared/measure/band-stretches';
import type { PolygonShape, TriangleShape } from '#shared/measure/flat-shape';
import type { Shape } from '#shared/measure/shape';
import type { BoxShape } from '#shared/measure/solid-shape';

/** How far a flat figure reaches, in mm: the longest straight line within it, and the least distance between parallels that hold it. */
export interface FlatSpan {
  readonly longest_mm: number;
  readonly width_mm: number;
}

const ofRectangle = (one_mm: number, other_mm: number): FlatSpan => ({
  longest_mm: Math.hypot(one_mm, other_mm),
  width_mm: Math.min(one_mm, other_mm),
});

const ofDisc = (diameter_mm: number): FlatSpan => ({ longest_mm: diameter_mm, width_mm: diameter_mm });

// Its apex may stand anywhere, so its longest side has no end; of all triangles of a base and a height the widest has two equal sides.
const ofTriangle = ({ base_mm, height_mm }: TriangleShape): FlatSpan => ({
  longest_mm: Infinity,
  width_mm: (base_mm * height_mm) / Math.max(base_mm, Math.hypot(base_mm / 2, height_mm)) || 0,
});

function ofPolygon({ points: corners }: PolygonShape): FlatSpan {
  const points = corners.map(({ x_mm, y_mm }) => ({ x: x_mm, y: y_mm }));
  const longest_mm = Math.max(0, ...points.flatMap((from) => points.map((to) => distance(from, to))));
  return { longest_mm, width_mm: leastWidth(points) };
}

// The faces that count, each pair once; all of them where none does.
function ofBox({ length_mm, depth_mm, height_mm, faces }: BoxShape): FlatSpan[] {
  const pairs = [
    { counts: faces.top || faces.bottom, face: ofRectangle(length_mm, depth_mm) },
    { counts: faces.front || faces.back, face: ofRectangle(length_mm, height_mm) },
    { counts: faces.left || faces.right, face: ofRectangle(depth_mm, height_mm) },
  ];
  const counting = pairs.filter(({ counts }) => counts);
  return (counting.length > 0 ? counting : pairs).map(({ face }) => face);
}

/** The spans of a shape's flat faces, in mm; none for a shape that is not flat, or whose form nobody gave. */
export function flatSpans(shape: Shape): FlatSpan[] {
  switch (shape.kind) {
    case 'rectangle':
      return [ofRectangle(shape.length_mm, shape.height_mm)];
    case 'band':
      return [ofRectangle(bandLength(shape.length), shape.height_mm)];
    case 'circle':
      return [ofDisc(shape.diameter_mm)];
    case 'ring':
      return [ofDisc(shape.outerDiameter_mm)];
    case 'ellipse':
      return [
        {
          longest_mm: Math.max(shape.length_mm, shape.height_mm),
          width_mm: Math.min(shape.length_mm, shape.height_mm),
        },
      ];
    case 'triangle':
      return [ofTriangle(shape)];
    case 'polygon':
      return [ofPolygon(shape)];
    case 'box':
      return ofBox(shape);
    default:
      return [];
  }
}
