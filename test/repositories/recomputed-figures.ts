import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { Snapshot } from '#shared/estimates/snapshot';

/** What an issue is worked from: nothing else may enter its figures. */
export interface Worked extends Pick<Snapshot, 'draft' | 'choice' | 'card'> {
  readonly workshop: Pick<Snapshot['workshop'], 'currency'>;
}

/** The figures of an issue, worked again from what it froze. */
export function recomputedFigures({ draft, choice, card, workshop }: Worked): Figures {
  const prepared = prepareEstimate({ draft, choice, card, currency: workshop.currency });
  return estimateFigures(prepared, riskOf(prepared.risk));
}
