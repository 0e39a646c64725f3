import { randomUUID } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { listPeople } from '#shared/accounts/people-endpoints';
import { issueEstimate } from '#shared/estimates/issues-endpoints';
import { listJobs } from '#shared/jobs/jobs-endpoints';
import { sampleEstimate } from './sample-estimate';
import type { Api } from './start-api';

/** How much longer others waited while a crowd was at it, and what the crowd was answered. */
export interface Crowded {
  readonly ratio: number;
  readonly answers: readonly { readonly status: number; readonly retryAfter_seconds: number }[];
}

const p95 = (times: readonly number[]): number =>
  times.toSorted((one, other) => one - other)[Math.floor(times.length * 0.95)] ?? Number.NaN;

/** How long somebody of the office waits for a list of jobs, asked for every 25 ms; each time another person, within their limit. */
export async function waited(api: Api, times: number): Promise<number> {
  const { visitor } = await api.newcomer(api.ours, 'office');
  const found: number[] = [];
  for (let time = 0; time < times; time++) {
    const began = performance.now();
    const { status } = await visitor.call(listJobs);
    if (status !== 200) throw new Error(`the list of jobs was answered with ${status}`);
    found.push(performance.now() - began);
    await pause(25);
  }
  return p95(found);
}

/** A thousand requests of one person as fast as they come. */
export async function rushed(api: Api): Promise<Crowded> {
  const { visitor } = await api.newcomer(api.ours, 'estimator');
  const quiet = await waited(api, 80);
  const rush = async () => {
    const answers: Crowded['answers'][number][] = [];
    for (let count = 0; count < 1_000; count++) {
      const { status, headers } = await visitor.call(listPeople);
      answers.push({ status, retryAfter_seconds: Number(headers['retry-after'] ?? 0) });
      await pause(5);
    }
    return answers;
  };
  const rushing = rush();
  const busy = await waited(api, 80);
  return { ratio: busy / quiet, answers: await rushing };
}

async function order({ app, ours }: Api) {
  const { estimateId } = await sampleEstimate(ours);
  const { version } = (await app.estimates.drafts.whole(ours.id, estimateId)).estimate;
  return { params: { estimateId }, body: { version, note: '', acceptsOldCard: false }, key: randomUUID() };
}

/** Twenty issues with their papers ordered at once; the first of all was made before, since it starts the threads. */
export async function issuedTogether(api: Api): Promise<Crowded> {
  const issue = (call: Awaited<ReturnType<typeof order>>) => api.as('owner').call(issueEstimate, call);
  await issue(await order(api));
  const orders = [];
  for (let count = 0; count < 20; count++) orders.push(await order(api));
  const quiet = await waited(api, 80);
  const issuing = Promise.all(orders.map(issue));
  const busy = await waited(api, 80);
  const answers = (await issuing).map(({ status }) => ({ status, retryAfter_seconds: 0 }));
  return { ratio: busy / quiet, answers };
}
