import { parentPort } from 'node:worker_threads';
import { TooLarge } from '#shared/money/too-large';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { RiskInput } from '#shared/estimates/risk/risk-input';

/** Draws the risk of estimates away from the thread that answers requests. */
parentPort?.on('message', (input: RiskInput) => {
  try {
    parentPort?.postMessage({ answer: riskOf(input) });
  } catch (error) {
    parentPort?.postMessage({ error: (error as Error).message, isTooLarge: error instanceof TooLarge });
  }
});
