import { estimateFigures, prepareEstimate, type EstimateInput } from '#shared/estimates/estimate-figures';
import { estimateWorkbook } from '../../backend/src/documents/workbook/estimate-workbook';
import { recalculated } from '../documents/recalculated';
import { sampleSnapshot } from '../documents/sample-snapshot';
import type { Benchmark, Measure } from './benchmark';
import { sizedEstimate } from './sized-estimate';

const median = (figures: readonly number[]): number =>
  figures.toSorted((one, other) => one - other)[Math.floor(figures.length / 2)] ?? Number.NaN;

function milliseconds(work: () => void): number {
  const start = performance.now();
  work();
  return performance.now() - start;
}

/** All of an estimate, worked from nothing; its contingency is a share, so that no draws are waited for. */
const work = (input: EstimateInput) => (): void => void estimateFigures(prepareEstimate(input), null);

/** The works in turn, again and again, so that whatever else the machine does falls on all of them; the median of each, warmed up first. */
function medians(works: readonly (() => void)[], runs: number): number[] {
  for (let warm = 0; warm < 5; warm += 1) for (const one of works) one();
  const times = works.map((): number[] => []);
  for (let run = 0; run < runs; run += 1) works.forEach((one, place) => times[place]?.push(milliseconds(one)));
  return times.map(median);
}

const count = (input: EstimateInput, of: 'zones' | 'ornaments'): number =>
  input.draft.members.reduce((sum, member) => sum + member[of].length, 0);

async function measure(): Promise<readonly Measure[]> {
  const [small, large] = [sizedEstimate(50), sizedEstimate(200)];
  const [small_ms = Number.NaN, large_ms = Number.NaN] = medians([work(small), work(large)], 25);
  const sheet = await recalculated(await estimateWorkbook(sampleSnapshot(large.draft)));
  const sheet_ms = median([1, 2, 3].map(() => milliseconds(sheet.rebuild)));
  return [
    { what: 'members', figure: large.draft.members.length, unit: 'members', bound: { atLeast: 200 } },
    { what: 'their zones', figure: count(large, 'zones'), unit: 'zones', bound: { atLeast: 600 } },
    { what: 'their ornaments', figure: count(large, 'ornaments'), unit: 'ornaments', bound: { atLeast: 800 } },
    { what: 'the same as a workbook', figure: sheet.formulas.length, unit: 'formulas', bound: { atMost: 20_000 } },
    { what: 'against that workbook', figure: sheet_ms / large_ms, unit: 'times as fast', bound: { atLeast: 50 } },
    { what: 'four times the members', figure: large_ms / small_ms, unit: 'times the time', bound: { atMost: 4.4 } },
  ];
}

/** How fast an estimate is worked from nothing, against the workbook exported of it in a spreadsheet engine; the bounds are this project's own. */
export const calculationBenchmark: Benchmark = { title: 'A large estimate recalculated', measure };
