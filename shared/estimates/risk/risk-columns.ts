import { inverseDistribution } from '#shared/estimates/risk/inverse-distribution';
import { normalTable } from '#shared/estimates/risk/normal-table';
import { quantile, shareBelow } from '#shared/estimates/risk/quantile-table';
import type { RiskDraw, RiskInput } from '#shared/estimates/risk/risk-input';
import { type Generator32, seededGenerator } from '#shared/estimates/risk/seeded-generator';

/** The figure of every draw in every trial, by the key of the draw. */
export type RiskColumns = ReadonlyMap<string, Float64Array>;

const wordsThereAre = 4_294_967_296;

/** A share of cases strictly between 0 and 1; a division by a power of two is exact. */
const shareFrom = (next: Generator32): number => (next() + 0.5) / wordsThereAre;

const normals = (trials: number, next: Generator32): Float64Array =>
  new Float64Array(trials).map(() => quantile(normalTable, shareFrom(next)));

/** Keys in the order of their code units, so that the order of rows on a screen changes no figure. */
export const inKeyOrder = (draws: readonly RiskDraw[]): RiskDraw[] =>
  [...draws].sort((one, other) => (one.key < other.key ? -1 : Number(one.key > other.key)));

/**
 * Draws every input once per trial: u = Φ(√c·z₀ + √(1 − c)·zᵢ), then the inverse of its distribution. First all z₀, then input after input in
 * the order of their keys. RangeError for a common factor outside 0…1, a triple that does not rise, or a seed that is not whole.
 */
export function riskColumns(input: RiskInput, trials: number): RiskColumns {
  const { commonFactor, distribution, draws } = input;
  if (!(commonFactor >= 0 && commonFactor <= 1)) throw new RangeError('the common factor is between 0 and 1');
  const next = seededGenerator(input.seed);
  const shared = normals(trials, next);
  const [sharedWeight, ownWeight] = [Math.sqrt(commonFactor), Math.sqrt(1 - commonFactor)];
  const columns = new Map<string, Float64Array>();
  for (const draw of inKeyOrder(draws)) {
    const inverse = inverseDistribution(draw.triple, distribution);
    const own = normals(trials, next);
    const mixed = own.map((z, trial) => shareBelow(normalTable, sharedWeight * shared[trial] + ownWeight * z));
    columns.set(draw.key, mixed.map(inverse));
  }
  return columns;
}

/** The same draws with one trial in which every input is at its likely value. */
export const likelyColumns = (draws: readonly RiskDraw[]): RiskColumns =>
  new Map(draws.map((draw) => [draw.key, Float64Array.of(draw.triple.likely)]));
