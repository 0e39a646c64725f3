import { isBelowHalf } from '#shared/leaf/is-below-half';
import { hasRoomForLaps, type LeafStep, piecesAlong } from '#shared/leaf/leaf-step';
import { stripsFromLeaf } from '#shared/leaf/strips-from-leaf';
import { settled } from '#shared/money/settled';

/** A moulding to be laid in strips: girth across and run along in mm, its straight sides joined. */
export interface MouldingRun {
  readonly girth_mm: number;
  readonly run_mm: number;
  readonly closedRun: boolean;
}

/** What decides how many strips a leaf is cut into. */
export interface LaysChoice {
  /** Strips somebody chose; null takes the cheapest. */
  readonly strips: number | null;
  /** Fewest strips a leaf is cut into by itself: 2 on carved mouldings, else 1. */
  readonly fewestStrips: number;
  /** What a leaf and the laying of a piece cost, in one currency. */
  readonly leafCost: number;
  readonly pieceCost: number;
  /** There is no other piece like it, so that a small one shares its leaf with nothing. */
  readonly isAlone?: boolean;
}

/** A leaf cut into so many strips, and what that takes on one member. */
export interface LaysOption {
  readonly strips: number;
  readonly strip_mm: number;
  readonly laysAcross: number;
  readonly piecesAlong: number;
  readonly leaves: number;
  readonly pieces: number;
  readonly cost: number;
}

/** Leaf laid in strips on one member, leaves not rounded. */
export interface LaysLaying {
  readonly way: 'lays';
  readonly girth_mm: number;
  readonly run_mm: number;
  readonly lap_mm: number;
  readonly step_mm: number;
  readonly chosen: LaysOption;
  /** Every allowed way to cut the leaf, by number of strips. */
  readonly options: readonly LaysOption[];
  /** Small pieces cut whole from a leaf, so many each way; null for lays proper. */
  readonly small: { readonly across: number; readonly along: number } | null;
  readonly leaves: number;
  readonly pieces: number;
}

const mostStrips = 8;

function option(run: MouldingRun, step: LeafStep, strips: number): Omit<LaysOption, 'cost'> {
  const strip_mm = step.side_mm / strips;
  const laysAcross = piecesAlong(run.girth_mm, false, { side_mm: strip_mm, lap_mm: step.lap_mm });
  const along = piecesAlong(run.run_mm, run.closedRun, step);
  const isEmpty = laysAcross === 0 || along === 0;
  const pieces = isEmpty ? 0 : laysAcross * along;
  return { strips, strip_mm, laysAcross, piecesAlong: along, leaves: pieces / strips, pieces };
}

/** Numbers of strips (1…8) a leaf may be cut into with every strip wider than its two laps. */
export const allowedStrips = (step: LeafStep): number[] =>
  Array.from({ length: mostStrips }, (_, index) => index + 1).filter((strips) => hasRoomForLaps(step, strips));

function cheapest(options: readonly LaysOption[], choice: LaysChoice): LaysOption {
  const chosen = options.find((next) => next.strips === choice.strips);
  if (chosen) return chosen;
  const fine = options.filter((next) => next.strips >= choice.fewestStrips);
  const [first] = [...(fine.length > 0 ? fine : options)].sort((a, b) => a.cost - b.cost || a.pieces - b.pieces);
  if (!first) throw new RangeError('a leaf must be wider than two laps');
  return first;
}

// Identical small pieces below half a leaf both ways are cut whole from it, without laps: floor(s/a)·floor(s/b) to a leaf.
function smallPieces(run: MouldingRun, step: LeafStep): LaysLaying['small'] {
  if (run.closedRun || !isBelowHalf(run.girth_mm, step.side_mm) || !isBelowHalf(run.run_mm, step.side_mm)) return null;
  return { across: stripsFromLeaf(step.side_mm, run.girth_mm), along: stripsFromLeaf(step.side_mm, run.run_mm) };
}

/**
 * Leaves laid in strips along a moulding (mm): lays ceil((g−o)/(s/k−o)), pieces ceil((run−o)/(s−o)) or on a closed run ceil(run/(s−o)),
 * leaves pieces × lays ÷ k, for every k = 1…8 with s/k > 2o; takes the k of lowest cost of leaf and laying, then fewest pieces. Throws a
 * RangeError unless s > 2o. House rule of laying.
 */
export function laysLaying(run: MouldingRun, step: LeafStep, choice: LaysChoice): LaysLaying {
  const options = allowedStrips(step).map((strips) => {
    const counted = option(run, step, strips);
    return { ...counted, cost: settled(counted.leaves * choice.leafCost + counted.pieces * choice.pieceCost) };
  });
  const chosen = cheapest(options, choice);
  const small = choice.strips === null && !choice.isAlone ? smallPieces(run, step) : null;
  const { leaves, pieces } = small ? { leaves: 1 / (small.across * small.along), pieces: 1 } : chosen;
  const { girth_mm, run_mm } = run;
  const { side_mm, lap_mm } = step;
  return { way: 'lays', girth_mm, run_mm, lap_mm, step_mm: side_mm - lap_mm, chosen, options, small, leaves, pieces };
}
