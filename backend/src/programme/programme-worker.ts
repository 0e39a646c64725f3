import { parentPort, workerData } from 'node:worker_threads';
import type { PlanningQuestion } from '#shared/programme/planning-question';
import { programme } from '#shared/programme/programme';

const { request, search, seconds, stop } = workerData as PlanningQuestion;
const stopped = new Int32Array(stop);
const ends_milliseconds = performance.now() + seconds * 1000;

/** Asked before every further plan: time is up, or somebody wants no more. */
const shouldStop = (): boolean => Atomics.load(stopped, 0) === 1 || performance.now() >= ends_milliseconds;

/** Plans a programme away from the thread that answers requests, and tells of each better plan. */
const plan = programme(request, {
  ...search,
  limit: { shouldStop },
  onBetter: (better) => parentPort?.postMessage({ better }),
});
parentPort?.postMessage({ plan });
