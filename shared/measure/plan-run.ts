import { ellipsePerimeter } from '#shared/geometry/ellipse-perimeter';
import type { ArcPlan, EllipsePlan, MouldingShape, PolygonPlan, StraightPlan } from '#shared/measure/moulding-shape';

/** One side of a moulding's run: its length where it was measured, and what each mm further out adds to it. */
export interface PlanSide {
  readonly length_mm: number;
  readonly perOffset: number;
}

/** The run of a moulding on plan, side by side, and whether it closes. */
export interface PlanRun {
  readonly sides: readonly PlanSide[];
  readonly closed: boolean;
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** What one mitre adds to each of the two sides that meet in it, per mm of offset: tan(α/2), 1 at a square corner. */
const mitreTangent = (turn_degrees: number) =>
  Math.abs(turn_degrees) === 90 ? Math.sign(turn_degrees) : Math.tan(radians(turn_degrees) / 2);

// Returns go to the ends of the sides in order, two to a side; each lengthens its side and itself by the offset (square mitres).
function straightSides({ sides_mm, returns_mm }: StraightPlan): PlanSide[] {
  const returnsAt = (index: number) => Math.min(2, Math.max(0, returns_mm.length - 2 * index));
  return [
    ...sides_mm.map((length_mm, index) => ({ length_mm, perOffset: returnsAt(index) })),
    ...returns_mm.map((length_mm) => ({ length_mm, perOffset: 1 })),
  ];
}

function polygonSides({ sides_mm, turns_degrees, closed }: PolygonPlan): PlanSide[] {
  const tangents = turns_degrees.map(mitreTangent);
  const before = (index: number) => (index > 0 ? tangents[index - 1] : closed ? tangents[tangents.length - 1] : 0);
  return sides_mm.map((length_mm, index) => ({
    length_mm,
    perOffset: (before(index) ?? 0) + (tangents[index] ?? 0),
  }));
}

const arcSide = ({ radius_mm, angle_degrees }: ArcPlan): PlanSide => ({
  length_mm: radius_mm * radians(angle_degrees),
  perOffset: radians(angle_degrees),
});

// The curve at a constant distance from a closed convex one is longer by 2π times the distance (Steiner).
const ellipseSide = ({ length_mm, width_mm }: EllipsePlan): PlanSide => ({
  length_mm: ellipsePerimeter(length_mm / 2, width_mm / 2),
  perOffset: 2 * Math.PI,
});

/**
 * The run of a moulding as measured on plan, and how it grows with the distance outwards: 2πd on a closed convex plan, 2d·tan(α/2)
 * at a mitre, dθ along an arc; a moulding that faces inward shrinks instead. Lengths in mm.
 */
export function planRun({ plan, facing }: Pick<MouldingShape, 'plan' | 'facing'>): PlanRun {
  const turned = (sides: PlanSide[]) =>
    facing === 'outward' ? sides : sides.map(({ length_mm, perOffset }) => ({ length_mm, perOffset: 0 - perOffset }));
  switch (plan.form) {
    case 'straight':
      return { sides: straightSides(plan), closed: false };
    case 'arc':
      return { sides: turned([arcSide(plan)]), closed: plan.angle_degrees === 360 };
    case 'ellipse':
      return { sides: turned([ellipseSide(plan)]), closed: true };
    case 'polygon':
      return { sides: turned(polygonSides(plan)), closed: plan.closed };
  }
}

/** Length of a run at an offset outwards from where it was measured, in mm, side by side. */
export const sidesAt = ({ sides }: PlanRun, offset_mm: number): number[] =>
  sides.map(({ length_mm, perOffset }) => length_mm + perOffset * offset_mm);
