import { issuedTogether, rushed, type Crowded } from '../api/crowd';
import type { Api } from '../api/start-api';
import type { Benchmark, Measure } from './benchmark';
import { withApi } from './served-api';

/** Whoever else uses the machine makes a round slow, not the server: the best of three counts. */
async function best(api: Api, crowd: (api: Api) => Promise<Crowded>): Promise<number> {
  const ratios: number[] = [];
  for (let round = 0; round < 3; round += 1) ratios.push((await crowd(api)).ratio);
  return Math.min(...ratios);
}

const measure = (): Promise<readonly Measure[]> =>
  withApi(async (api) => [
    {
      what: 'a thousand requests of one',
      figure: await best(api, rushed),
      unit: 'times the wait',
      bound: { atMost: 2 },
    },
    {
      what: 'twenty issues at once',
      figure: await best(api, issuedTogether),
      unit: 'times the wait',
      bound: { atMost: 2 },
    },
  ]);

/** How long others wait while one person hurries or many order what is costly (ASVS 2.4.1, 15.2.2). */
export const crowdsBenchmark: Benchmark = { title: 'A crowd and everybody else', measure };
