import { workerToken } from '../../core/workers/worker-token';

/** Starts the worker that plans. */
export const PLANNING_STARTER = workerToken('PLANNING_STARTER', async () =>
  (await import('./start-planning-worker')).startPlanningWorker(),
);
