import type { Sample } from '#shared/geometry/uneven-simpson';

// Slope at one of its own samples of the polynomial through all of them (Lagrange's form, differentiated at a node).
function slopeWithin(near: readonly Sample[], own: number): number {
  const { at, value } = near[own];
  return near.reduce((sum, other, index) => {
    if (index === own) return sum;
    const rest = near.reduce(
      (product, third, place) =>
        place === own || place === index ? product : (product * (at - third.at)) / (other.at - third.at),
      1,
    );
    const weight = rest / (other.at - at);
    return sum + weight * other.value + value / (at - other.at);
  }, 0);
}

// The steepest a sample may be, from the larger of the steps to its two neighbours (of the first two at an end) over the length of
// both: between equal spaces twice that difference, and three times at an end, where a curve may be on its way to a crest. A limit by
// the neighbouring differences like Hyman’s filter (SIAM Journal on Scientific and Statistical Computing 4, 1983), but by the larger of
// them, since samples here swell and shrink: a smooth curve never meets it, a polynomial that overshoots beside a jump does.
function steepest(samples: readonly Sample[], index: number): number {
  const middle = Math.min(Math.max(1, index), samples.length - 2);
  const [before, own, after] = [samples[middle - 1], samples[middle], samples[middle + 1]];
  const step = Math.max(Math.abs(own.value - before.value), Math.abs(after.value - own.value));
  return ((index === middle ? 4 : 6) * step) / (after.at - before.at);
}

/**
 * Slope at every sample, in the unit of value ÷ place, of the polynomial through the five samples nearest to it (all of them when
 * there are fewer), no steeper than the steps beside it allow; exact for smooth curves up to the fourth degree. The places rise; a
 * single sample has slope 0.
 */
export function slopesAt(samples: readonly Sample[]): number[] {
  const size = Math.min(5, samples.length);
  return samples.map((_, index) => {
    const start = Math.min(Math.max(0, index - 2), samples.length - size);
    const slope = slopeWithin(samples.slice(start, start + size), index - start);
    const limit = samples.length > 2 ? steepest(samples, index) : Infinity;
    return Math.min(Math.max(slope, -limit), limit);
  });
}
