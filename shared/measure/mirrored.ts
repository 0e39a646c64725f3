import type { BandShape } from '#shared/measure/band-shape';
import type { PolygonShape } from '#shared/measure/flat-shape';
import type { MouldingPlan } from '#shared/measure/moulding-shape';
import type { Shape } from '#shared/measure/shape';

const otherHand = { left: 'right', right: 'left' } as const;

// Reversed as well as mirrored, so that the corners still run the same way round.
const mirroredPolygon = (shape: PolygonShape): PolygonShape => ({
  ...shape,
  points: shape.points.map(({ x_mm, y_mm }) => ({ x_mm: 0 - x_mm, y_mm })).toReversed(),
});

// Walked from its other end; a closed plan keeps its first side first, so its mitres shift by one.
function mirroredPlan(plan: MouldingPlan): MouldingPlan {
  if (plan.form !== 'polygon') return plan;
  const turns = plan.turns_degrees.toReversed();
  return {
    ...plan,
    sides_mm: plan.sides_mm.toReversed(),
    turns_degrees: plan.closed ? [...turns.slice(1), ...turns.slice(0, 1)] : turns,
  };
}

const mirroredBand = (shape: BandShape): BandShape => ({
  ...shape,
  length: shape.length.by === 'tape' ? shape.length : { ...shape.length, parts: shape.length.parts.toReversed() },
});

/** The other hand of a shape, lengths in mm: plan and corners mirrored left to right, twists turned the other way; its surface is the same. */
export function mirrored(shape: Shape): Shape {
  switch (shape.kind) {
    case 'polygon':
      return mirroredPolygon(shape);
    case 'moulding':
      return { ...shape, plan: mirroredPlan(shape.plan) };
    case 'twisted':
    case 'helicoid':
      return { ...shape, hand: otherHand[shape.hand] };
    case 'box':
      return { ...shape, faces: { ...shape.faces, left: shape.faces.right, right: shape.faces.left } };
    case 'band':
      return mirroredBand(shape);
    default:
      return shape;
  }
}
