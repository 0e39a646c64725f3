/** A value at a place along an axis. */
export interface Sample {
  readonly at: number;
  readonly value: number;
}

type Triple = readonly [Sample, Sample, Sample];

// The parabola through three samples, integrated over both of their intervals (composite Simpson's rule for irregularly spaced
// data: Cartwright, Journal of Mathematical Sciences and Mathematics Education 12, 2017).
function overTwo([first, middle, last]: Triple): number {
  const before = middle.at - first.at;
  const after = last.at - middle.at;
  const both = before + after;
  return (
    (both / 6) *
    ((2 - after / before) * first.value +
      ((both * both) / (before * after)) * middle.value +
      (2 - before / after) * last.value)
  );
}

// The same parabola over its second interval alone, for the interval left over by an odd number of them.
function overLast([first, middle, last]: Triple): number {
  const before = middle.at - first.at;
  const after = last.at - middle.at;
  const both = before + after;
  return (
    ((2 * after * after + 3 * after * before) / (6 * both)) * last.value +
    ((after * after + 3 * after * before) / (6 * before)) * middle.value -
    (after ** 3 / (6 * before * both)) * first.value
  );
}

/** What the rule takes at once: two intervals, or the one left over at the end of an odd number of them. */
export interface SimpsonPart {
  /** The samples its parabola (or, through two, its line) goes through. */
  readonly through: readonly Sample[];
  /** The places it reaches from and to, by the indexes of their samples. */
  readonly from: number;
  readonly to: number;
  /** Its integral, in the unit of value × place. */
  readonly value: number;
}

const tripleAt = (samples: readonly Sample[], index: number): Triple => [
  samples[index - 1],
  samples[index],
  samples[index + 1],
];

function pairAt(samples: readonly Sample[], index: number): SimpsonPart {
  const through = tripleAt(samples, index);
  return { through, from: index - 1, to: index + 1, value: overTwo(through) };
}

function lastOf(samples: readonly Sample[]): SimpsonPart {
  const to = samples.length - 1;
  if (to === 1) {
    const value = ((samples[1].at - samples[0].at) * (samples[0].value + samples[1].value)) / 2;
    return { through: samples, from: 0, to, value };
  }
  const through = tripleAt(samples, to - 1);
  return { through, from: to - 1, to, value: overLast(through) };
}

/** Simpson's rule over unevenly spaced samples, part by part. Throws a RangeError unless the places rise. */
export function simpsonParts(samples: readonly Sample[]): SimpsonPart[] {
  if (samples.some(({ at }, index) => index > 0 && !(at > samples[index - 1].at)))
    throw new RangeError('stations must follow one another');
  const intervals = Math.max(0, samples.length - 1);
  const pairs = Array.from({ length: Math.floor(intervals / 2) }, (_, pair) => pairAt(samples, 2 * pair + 1));
  return intervals % 2 === 1 ? [...pairs, lastOf(samples)] : pairs;
}

/**
 * Simpson's rule over unevenly spaced samples, in the unit of value × place; two samples give the trapezium, one or none zero.
 * Throws a RangeError unless the places rise.
 */
export const unevenSimpson = (samples: readonly Sample[]): number =>
  simpsonParts(samples).reduce((sum, { value }) => sum + value, 0);
