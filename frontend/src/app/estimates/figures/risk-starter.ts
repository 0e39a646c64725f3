import { workerToken } from '../../core/workers/worker-token';

/** Starts the worker that draws risk. */
export const RISK_STARTER = workerToken('RISK_STARTER', async () =>
  (await import('./start-risk-worker')).startRiskWorker(),
);
