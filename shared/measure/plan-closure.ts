import type { PolygonPlan } from '#shared/measure/moulding-shape';

/** How far the end of a closed plan lies from its beginning, and how far it may before somebody should look again; lengths in mm. */
export interface PlanClosure {
  readonly gap_mm: number;
  readonly isOpen: boolean;
}

interface Walk {
  readonly x: number;
  readonly y: number;
  readonly heading: number;
}

// Half a per cent of the way round is what a tape and a bevel leave on a good day; house value, no source.
const toleratedShare = 0.005;

/** Walks the sides of a plan with its mitre turns and tells whether the last side meets the first one (own geometry: the sides' vectors sum to nothing). */
export function planClosure({ sides_mm, turns_degrees }: PolygonPlan): PlanClosure {
  const end = sides_mm.reduce<Walk>(
    ({ x, y, heading }, side_mm, index) => ({
      x: x + side_mm * Math.cos(heading),
      y: y + side_mm * Math.sin(heading),
      heading: heading + ((turns_degrees[index] ?? 0) * Math.PI) / 180,
    }),
    { x: 0, y: 0, heading: 0 },
  );
  const gap_mm = Math.hypot(end.x, end.y);
  const round_mm = sides_mm.reduce((sum, side_mm) => sum + side_mm, 0);
  return { gap_mm, isOpen: gap_mm > Math.max(1, toleratedShare * round_mm) };
}

/** The longest side of a plan where it is as long as all others together or longer: no angles can close it. Undefined where they can; in mm. */
export function sideTooLong(sides_mm: readonly number[]): number | undefined {
  const longest_mm = Math.max(0, ...sides_mm);
  const others_mm = sides_mm.reduce((sum, side_mm) => sum + side_mm, 0) - longest_mm;
  return longest_mm > 0 && longest_mm >= others_mm ? longest_mm : undefined;
}
