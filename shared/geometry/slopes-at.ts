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

/**
 * Slope at every sample, in the unit of value ÷ place, of the polynomial through the five samples nearest to it (all of them when
 * there are fewer); exact for curves up to the fourth degree. The places rise; a single sample has slope 0.
 */
export function slopesAt(samples: readonly Sample[]): number[] {
  const size = Math.min(5, samples.length);
  return samples.map((_, index) => {
    const start = Math.min(Math.max(0, index - 2), samples.length - size);
    return slopeWithin(samples.slice(start, start + size), index - start);
  });
}
