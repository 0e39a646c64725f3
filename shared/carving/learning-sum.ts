import type { Learning, LearningModel } from '#shared/carving/carving-card';

/** One learning curve: a published model, what a doubling leaves in percent, and the piece after which nothing more is learnt. */
export interface LearningCurve {
  readonly model: LearningModel;
  readonly rate_percent: number;
  readonly plateau: number;
}

/** The curve of the card for single pieces, or for running ornament with its later plateau. */
export const learningCurve = (learning: Learning, isRunning: boolean): LearningCurve => ({
  model: learning.model,
  rate_percent: learning.rate_percent,
  plateau: isRunning ? learning.plateauRunning : learning.plateauPieces,
});

// t(n) = a·nᵇ: every unit has its own time (Wright's curve in Crawford's reading).
function unitSum(exponent: number, learnt: number): number {
  let sum = 0;
  for (let piece = 1; piece <= learnt; piece += 1) sum += piece ** exponent;
  return sum;
}

// A(n) = a·nᵇ is the average of the first n, so they take a·nᵇ⁺¹ together (Wright's own reading).
const averageSum = (exponent: number, learnt: number): number => (learnt === 0 ? 0 : learnt ** (exponent + 1));

/**
 * Hours of the first `count` pieces (whole, ≥ 0) in multiples of the first piece's hours. b = log2(rate); past the plateau N each
 * further piece takes the marginal time of the N-th, in both models. Throws a RangeError for a negative count.
 */
export function learningSum(curve: LearningCurve, count: number): number {
  if (count < 0) throw new RangeError('pieces cannot be fewer than none');
  const exponent = Math.log2(curve.rate_percent / 100);
  const sum = curve.model === 'unit' ? unitSum : averageSum;
  const learnt = Math.min(count, curve.plateau);
  if (count <= curve.plateau) return sum(exponent, learnt);
  const last = sum(exponent, learnt) - sum(exponent, learnt - 1);
  return sum(exponent, learnt) + (count - learnt) * last;
}
