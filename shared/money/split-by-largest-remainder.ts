import { D, type MinorUnits } from '#shared/money/decimal';
import { safeMinor } from '#shared/money/safe-minor';
import { settled } from '#shared/money/settled';

const weightOf = (weight: number | D): D => (typeof weight === 'number' ? new D(String(settled(weight))) : weight);

interface Fraction {
  readonly place: number;
  readonly exact: D;
  readonly about: number;
}

/** Decimals are compared only where floating-point figures cannot tell; those of fractions are good to 1e-15. */
const bySize = (one: Fraction, other: Fraction): number =>
  Math.abs(other.about - one.about) > 1e-12 ? other.about - one.about : other.exact.comparedTo(one.exact);

/** The places to correct by one: those whose fraction has the sign of what is left, largest first, ties to the earlier. */
function placesToCorrect(fractions: readonly D[], left: number): number[] {
  return fractions
    .map((fraction, place) => {
      const exact = left < 0 ? fraction.negated() : fraction;
      return { place, exact, about: exact.toNumber() };
    })
    .sort((one, other) => bySize(one, other) || one.place - other.place)
    .slice(0, Math.abs(left))
    .map(({ place }) => place);
}

/**
 * Splits whole minor units in proportion to weights of any one unit, so that the parts sum to the total and each is within one minor
 * unit of its exact share: shares are cut towards zero, what is left goes by ones to the largest remainders, ties to the earlier, a
 * negative total as its absolute value. RangeError when there is something to split and the weights sum to zero.
 */
export function splitByLargestRemainder(total_minor: MinorUnits, weights: readonly (number | D)[]): MinorUnits[] {
  const exactWeights = weights.map(weightOf);
  const sum = exactWeights.reduce((before, weight) => before.plus(weight), new D(0));
  if (safeMinor(total_minor) === 0) return weights.map(() => 0);
  if (sum.isZero()) throw new RangeError('an amount cannot be split over weights that sum to zero');
  const shares = exactWeights.map((weight) => weight.times(total_minor).div(sum));
  const parts = shares.map((share) => share.trunc().toNumber() + 0);
  const left = total_minor - parts.reduce((before, part) => before + part, 0);
  if (left === 0) return parts.map(safeMinor);
  const fractions = shares.map((share, place) => share.minus(parts[place]));
  for (const place of placesToCorrect(fractions, left)) parts[place] += Math.sign(left);
  return parts.map(safeMinor);
}
