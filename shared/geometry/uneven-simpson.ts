/** A value at a place along an axis. */
export interface Sample {
  readonly at: number;
  readonly value: number;
}

// The parabola through three samples, integrated over both of their intervals (composite Simpson's rule for irregularly spaced
// data: Cartwright, Journal of Mathematical Sciences and Mathematics Education 12, 2017).
function overTwo([first, middle, last]: readonly [Sample, Sample, Sample]): number {
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
function overLast([first, middle, last]: readonly [Sample, Sample, Sample]): number {
  const before = middle.at - first.at;
  const after = last.at - middle.at;
  const both = before + after;
  return (
    ((2 * after * after + 3 * after * before) / (6 * both)) * last.value +
    ((after * after + 3 * after * before) / (6 * before)) * middle.value -
    (after ** 3 / (6 * before * both)) * first.value
  );
}

const tripleAt = (samples: readonly Sample[], index: number): readonly [Sample, Sample, Sample] => [
  samples[index - 1],
  samples[index],
  samples[index + 1],
];

/**
 * Simpson's rule over unevenly spaced samples, in the unit of value × place; two samples give the trapezium, one or none zero.
 * Throws a RangeError unless the places rise.
 */
export function unevenSimpson(samples: readonly Sample[]): number {
  const intervals = samples.length - 1;
  if (samples.some(({ at }, index) => index > 0 && !(at > samples[index - 1].at)))
    throw new RangeError('stations must follow one another');
  if (intervals < 1) return 0;
  if (intervals === 1) return ((samples[1].at - samples[0].at) * (samples[0].value + samples[1].value)) / 2;
  let sum = intervals % 2 === 1 ? overLast(tripleAt(samples, intervals - 1)) : 0;
  for (let index = 1; index < intervals; index += 2) sum += overTwo(tripleAt(samples, index));
  return sum;
}
