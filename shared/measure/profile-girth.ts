import { strokeLength, strokeMoment, strokeReach } from '#shared/geometry/stroke';
import { drawnStrokes, type ProfilePiece } from '#shared/measure/profile-curve';

/** Girth of one element of a profile in mm, and its first moment about x = 0 in mm² (girth × distance of its centroid). */
export interface ElementGirth {
  readonly id: string;
  readonly element: ProfilePiece['element'];
  readonly girth_mm: number;
  readonly moment_mm2: number;
}

/** A profile's girth by element and together, where its centroid lies, and how far it reaches back and forward, in mm. */
export interface ProfileGirth {
  readonly elements: readonly ElementGirth[];
  readonly girth_mm: number;
  readonly centroid_mm: number;
  readonly back_mm: number;
  readonly front_mm: number;
}

const total = (figures: readonly number[]) => figures.reduce((sum, figure) => sum + figure, 0);

const elementGirth = ({ id, element, strokes }: ProfilePiece): ElementGirth => ({
  id,
  element,
  girth_mm: total(strokes.map(strokeLength)),
  moment_mm2: total(strokes.map((stroke) => strokeMoment(stroke).x)),
});

/** Girth and centroid of a profile's curve; all lengths in mm, 0 for a profile without elements. */
export function profileGirth(pieces: readonly ProfilePiece[]): ProfileGirth {
  const elements = pieces.map(elementGirth);
  const girth_mm = total(elements.map((element) => element.girth_mm));
  const reach = pieces
    .flatMap(drawnStrokes)
    .flatMap(strokeReach)
    .map(({ x }) => x);
  return {
    elements,
    girth_mm,
    centroid_mm: girth_mm === 0 ? (reach[0] ?? 0) : total(elements.map((element) => element.moment_mm2)) / girth_mm,
    back_mm: reach.length === 0 ? 0 : Math.min(...reach),
    front_mm: reach.length === 0 ? 0 : Math.max(...reach),
  };
}
