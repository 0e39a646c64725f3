import { draftInOrder } from '#shared/estimates/draft-in-order';
import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { MemberContentRow, PieceContentRow } from './content-model';
import type { EstimateRow } from './estimate-model';

/** An estimate with everything in it, as the tables hold it. */
export interface WholeEstimate {
  readonly estimate: EstimateRow;
  readonly pieces: readonly PieceContentRow[];
  readonly members: readonly MemberContentRow[];
}

/** The figures of record of the base: no alternative chosen, risk drawn. */
export function workedEstimate({ estimate, pieces, members }: WholeEstimate, card: RateCard): Figures {
  const draft = draftInOrder(estimate.settings, pieces, members);
  const prepared = prepareEstimate({ draft, choice: [], card, currency: estimate.currency });
  return estimateFigures(prepared, riskOf(prepared.risk));
}
