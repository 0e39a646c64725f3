/** What a figure may be at most, or must be at least, to pass. */
export type Bound = { readonly atMost: number } | { readonly atLeast: number };

/** One figure with its bound. A ratio to something measured in the same run says more than seconds of one machine. */
export interface Measure {
  readonly what: string;
  readonly figure: number;
  readonly unit: string;
  readonly bound: Bound;
}

/**
 * A section of the run. A file `<name>-benchmark.ts` in this folder exports one under its own name in camelCase
 * (`first-visit-benchmark.ts` → `firstVisitBenchmark`) and is found by its ending.
 */
export interface Benchmark {
  readonly title: string;
  readonly measure: () => Promise<readonly Measure[]>;
}
