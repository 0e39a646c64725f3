import { listJobs } from '#shared/jobs/jobs-endpoints';
import { sampleJob } from '../api/sample-job';
import type { Api, TestWorkshop } from '../api/start-api';
import type { Benchmark, Measure } from './benchmark';
import { withApi } from './served-api';

const few = 1_000;
const many = 100_000;
const rounds = 60;

/** What an estimator asks of the list; the bench types its searches. */
const asked = {
  'the first page': {},
  'by state': { state: 'open' },
  'by title': { order: 'title' },
  'a word many have': { search: 'console' },
  'a word twenty have': { search: 'rare7' },
  'two words': { search: 'console gilt' },
} as const;

/** Fills a workshop with copies of one job: other numbers, titles, days and words. */
async function fill({ platform }: Api, workshop: TestWorkshop, jobs: number): Promise<void> {
  const jobId = await sampleJob(workshop);
  const { database } = platform;
  const values = { workshopId: workshop.id, jobId, jobs };
  await database.execute(
    `INSERT INTO jobs SELECT workshop_id, CONCAT('00000000-0000-7000-8000-', LPAD(seq, 12, '0')), client_id, 2001, seq,
       CONCAT('Console base ', LPAD((seq * 7919) % :jobs, 6, '0')), kind, reference, site, note, state, reached, version,
       changed_at - INTERVAL seq MINUTE, created_at FROM jobs, seq_1_to_100000
     WHERE workshop_id = :workshopId AND id = :jobId AND seq <= :jobs`,
    values,
  );
  for (const [word, every] of [
    ['console', 1],
    ['gilt', 3],
    ['rare7', jobs / 20],
  ] as const) {
    await database.execute(
      `INSERT INTO search_words SELECT workshop_id, 'job', :word, id FROM jobs
       WHERE workshop_id = :workshopId AND year = 2001 AND ordinal % :every = 0`,
      { ...values, word, every },
    );
  }
  await database.execute('ANALYZE TABLE jobs, search_words');
}

async function timed(workshop: TestWorkshop, query: Record<string, string>): Promise<number> {
  const started = performance.now();
  const response = await workshop.people.owner.visitor.call(listJobs, { query: { limit: 50, ...query } });
  if (response.status !== 200) throw new Error(`the list was not given: ${response.status}`);
  return performance.now() - started;
}

const middle = (times: readonly number[]): number =>
  [...times].sort((a, b) => a - b)[Math.floor(times.length / 2)] ?? Number.NaN;

/** The two lists in turn, so that what else the machine does falls on both. */
async function growth(small: TestWorkshop, large: TestWorkshop, query: Record<string, string>): Promise<number> {
  const times = { small: [] as number[], large: [] as number[] };
  for (let round = 0; round < rounds; round++) {
    times.small.push(await timed(small, query));
    times.large.push(await timed(large, query));
  }
  return middle(times.large) / middle(times.small);
}

const measure = (): Promise<readonly Measure[]> =>
  withApi(async (api) => {
    await fill(api, api.ours, few);
    await fill(api, api.theirs, many);
    const measures: Measure[] = [];
    for (const [what, query] of Object.entries(asked)) {
      const figure = await growth(api.ours, api.theirs, query);
      measures.push({ what: `${what}: 100,000 jobs against 1,000`, figure, unit: 'times', bound: { atMost: 1.3 } });
    }
    return measures;
  });

/** How a list of jobs grows with the jobs that are kept. */
export const jobListBenchmark: Benchmark = { title: 'The list of jobs', measure };
