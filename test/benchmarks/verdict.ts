import type { Bound, Measure } from './benchmark';

/** Whether a figure keeps its bound; a figure that is none never does. */
export function keepsBound(figure: number, bound: Bound): boolean {
  return 'atMost' in bound ? figure <= bound.atMost : figure >= bound.atLeast;
}

const written = (figure: number): string =>
  figure.toLocaleString('en-GB', { maximumSignificantDigits: 4, useGrouping: false });

const boundText = (bound: Bound): string =>
  'atMost' in bound ? `at most ${written(bound.atMost)}` : `at least ${written(bound.atLeast)}`;

/** One line of the report: pass or FAIL, what was measured, the figure and its bound. */
export function verdict({ what, figure, unit, bound }: Measure): string {
  return `  ${keepsBound(figure, bound) ? 'pass' : 'FAIL'}  ${what}: ${written(figure)} ${unit} (${boundText(bound)})`;
}
