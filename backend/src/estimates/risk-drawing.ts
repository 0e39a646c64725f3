import { join } from 'node:path';
import { estimateFigures, prepareEstimate, type EstimateInput } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import type { Risk } from '#shared/estimates/risk/risk';
import type { RiskInput } from '#shared/estimates/risk/risk-input';
import { threadFile } from '../platform/threads/thread-file';
import { ThreadQueue } from '../platform/threads/thread-queue';

/** Draws risk in a thread of its own: 4,000 trials would keep everybody else waiting. */
export class RiskDrawing {
  private readonly thread = new ThreadQueue<RiskInput, Risk>(() => threadFile(join(__dirname, 'risk-worker.ts')));

  /** The figures of an estimate with its risk. */
  async figures(input: EstimateInput): Promise<Figures> {
    const prepared = prepareEstimate(input);
    return estimateFigures(prepared, await this.thread.ask(prepared.risk));
  }

  /** The same, drawn only where the price waits for it. */
  async priced(input: EstimateInput): Promise<Figures> {
    const prepared = prepareEstimate(input);
    return estimateFigures(prepared, prepared.needsRisk ? await this.thread.ask(prepared.risk) : null);
  }
}
