import { riskOf } from '#shared/estimates/risk/risk-of';
import type { RiskInput } from '#shared/estimates/risk/risk-input';

/** Draws the risk of an estimate away from the page, so that typing never waits for it. */
addEventListener('message', ({ data }: MessageEvent<RiskInput>) => postMessage(riskOf(data)));
