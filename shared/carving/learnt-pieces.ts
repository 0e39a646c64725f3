import type { Learning } from '#shared/carving/carving-card';
import type { OrnamentUse } from '#shared/carving/ornament-use';
import { learningCurve, learningSum } from '#shared/carving/learning-sum';

/** Pieces of one repeated ornament to be learnt on. */
export interface PiecesToLearn {
  readonly use: OrnamentUse;
  readonly timberId: string;
  /** Module carved, in mm. */
  readonly size_mm: number;
  readonly isRunning: boolean;
  readonly pieces: number;
}

/** What a use takes of its group's learning: its own share in first-unit pieces, and the pieces of the whole group. */
export interface LearntPieces {
  readonly learnt: number;
  readonly group: number;
}

// Hands learn one ornament of one size, timber, relief, undercut and plan; the other hand of a pair is learnt anew unless it is marked.
const groupKey = ({ use, timberId, size_mm }: PiecesToLearn): string =>
  [
    use.ornamentId,
    size_mm.toPrecision(9),
    timberId,
    use.relief,
    use.isUndercut,
    use.plan,
    use.isMirrored && !use.joinsLearning,
  ].join(' ');

/** All pieces learnt on one curve; those of one ornament run along or stand alone, all of them alike. */
interface LearningGroup {
  readonly pieces: number;
  readonly isRunning: boolean;
}

const sumOf = ({ pieces, isRunning }: LearningGroup, learning: Learning): number =>
  learningSum(learningCurve(learning, isRunning), pieces);

/**
 * Learning over all uses of an estimate, in their order: pieces of one group are counted on one curve, and its sum is shared by
 * pieces. Pieces are whole; answers are in multiples of the first piece's hours.
 */
export function learntPieces(uses: readonly PiecesToLearn[], learning: Learning): LearntPieces[] {
  const keys = uses.map(groupKey);
  const groups = new Map<string, LearningGroup>();
  uses.forEach((use, place) => {
    const pieces = (groups.get(keys[place])?.pieces ?? 0) + use.pieces;
    groups.set(keys[place], { pieces, isRunning: use.isRunning });
  });
  const sums = new Map([...groups].map(([key, group]) => [key, sumOf(group, learning)]));
  return uses.map((use, place) => {
    const group = groups.get(keys[place])?.pieces ?? 0;
    return { learnt: group === 0 ? 0 : ((sums.get(keys[place]) ?? 0) * use.pieces) / group, group };
  });
}
