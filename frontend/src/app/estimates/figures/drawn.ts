import { Observable } from 'rxjs';
import type { Risk } from '#shared/estimates/risk/risk';
import type { RiskInput } from '#shared/estimates/risk/risk-input';
import { riskOf } from '#shared/estimates/risk/risk-of';
import { askWorker } from '../../core/workers/ask-worker';
import type { WorkerStarter } from '../../core/workers/worker-token';

/** The risk that was drawn, and what it was drawn from. */
export interface Drawn {
  readonly input: RiskInput;
  readonly risk: Risk;
}

async function ask(start: WorkerStarter, input: RiskInput, signal: AbortSignal): Promise<Risk> {
  const worker = await start();
  return askWorker<RiskInput, Risk>(worker, input, signal);
}

/** Draws risk in a worker, which is ended when nobody waits any more; where none can run, the page draws it and waits. */
export const drawnBy = (start: WorkerStarter, input: RiskInput): Observable<Drawn> =>
  new Observable<Drawn>((subscriber) => {
    const abort = new AbortController();
    ask(start, input, abort.signal)
      .catch(() => (abort.signal.aborted ? undefined : riskOf(input)))
      .then((risk) => {
        if (risk) subscriber.next({ input, risk });
        subscriber.complete();
      })
      .catch((error: unknown) => subscriber.error(error));
    return () => abort.abort();
  });
