import { countUp } from '#shared/money/settled';

/** Side of a leaf or piece and the lap between neighbours, in mm. */
export interface LeafStep {
  readonly side_mm: number;
  readonly lap_mm: number;
}

/** Whether a leaf cut in so many is still wider than its two laps. */
export const hasRoomForLaps = ({ side_mm, lap_mm }: LeafStep, cuts: number): boolean =>
  side_mm / cuts > 2 * lap_mm * (1 + 1e-9);

/**
 * Pieces that cover a length in mm, each lapping the one before by the lap; round a closed run the last laps the first as well. At least
 * one wherever there is a length.
 */
export function piecesAlong(length_mm: number, isClosed: boolean, { side_mm, lap_mm }: LeafStep): number {
  if (length_mm <= 0) return 0;
  return Math.max(1, countUp((length_mm - (isClosed ? 0 : lap_mm)) / (side_mm - lap_mm)));
}
