import { hasRoomForLaps, type LeafStep } from '#shared/leaf/leaf-step';

/** Leaf laid in small cuts on one member, leaves not rounded. */
export interface PatchesLaying {
  readonly way: 'patches';
  readonly area_mm2: number;
  /** Each leaf is cut in so many each way. */
  readonly cuts: number;
  /** Side of what all the cuts of one leaf cover together. */
  readonly covered_mm: number;
  readonly leaves: number;
  readonly pieces: number;
}

/**
 * Leaves for an area (mm²) patched with leaf cut c ways each way: area ÷ (s − c·o)², not rounded. Throws a RangeError unless a cut is
 * wider than its two laps. House rule of laying.
 */
export function patchesLaying(area_mm2: number, step: LeafStep, cuts: number): PatchesLaying {
  if (!hasRoomForLaps(step, cuts)) throw new RangeError('a cut must be wider than two laps');
  const covered_mm = step.side_mm - cuts * step.lap_mm;
  const leaves = area_mm2 / covered_mm ** 2;
  return { way: 'patches', area_mm2, cuts, covered_mm, leaves, pieces: leaves * cuts ** 2 };
}
