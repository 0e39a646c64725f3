import { join } from 'node:path';
import { estimateFigures, prepareEstimate, type EstimateInput } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import type { Risk } from '#shared/estimates/risk/risk';
import type { RiskInput } from '#shared/estimates/risk/risk-input';
import { TooLarge } from '#shared/money/too-large';
import { Rejection } from '#shared/problems/rejection';
import { threadFile } from '../platform/threads/thread-file';
import { ThreadQueue } from '../platform/threads/thread-queue';

/** Every entry was possible by itself; together they come to more than is worked: refused in words, so nothing of it is kept. */
async function refusingTooLarge(work: () => Promise<Figures>): Promise<Figures> {
  try {
    return await work();
  } catch (error) {
    if (error instanceof TooLarge) throw new Rejection('unprocessable', 'estimate-too-large');
    throw error;
  }
}

/** Draws risk in a thread of its own: 4,000 trials would keep everybody else waiting. */
export class RiskDrawing {
  private readonly thread = new ThreadQueue<RiskInput, Risk>(() => threadFile(join(__dirname, 'risk-worker.ts')));

  /** The figures of an estimate with its risk. */
  async figures(input: EstimateInput): Promise<Figures> {
    return refusingTooLarge(async () => {
      const prepared = prepareEstimate(input);
      return estimateFigures(prepared, await this.thread.ask(prepared.risk));
    });
  }

  /** The same, drawn only where the price waits for it. */
  async priced(input: EstimateInput): Promise<Figures> {
    return refusingTooLarge(async () => {
      const prepared = prepareEstimate(input);
      return estimateFigures(prepared, prepared.needsRisk ? await this.thread.ask(prepared.risk) : null);
    });
  }
}
