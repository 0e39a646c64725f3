import type { Choice } from '#shared/estimates/draft';
import { draftInOrder } from '#shared/estimates/draft-in-order';
import type { EstimateInput } from '#shared/estimates/estimate-figures';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { MemberContentRow, PieceContentRow } from './content-model';
import type { EstimateRow } from './estimate-model';

/** An estimate with everything in it, as the tables hold it. */
export interface WholeEstimate {
  readonly estimate: EstimateRow;
  readonly pieces: readonly PieceContentRow[];
  readonly members: readonly MemberContentRow[];
}

/** What an estimate is worked from, on a card and with a choice of alternatives; none is the base. */
export function inputOf(whole: WholeEstimate, card: RateCard, choice: Choice = []): EstimateInput {
  const { estimate, pieces, members } = whole;
  return { draft: draftInOrder(estimate.settings, pieces, members), choice, card, currency: estimate.currency };
}
