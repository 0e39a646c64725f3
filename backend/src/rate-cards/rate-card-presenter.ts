import type { RateCardState, RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import type { RateCardHead, RateCardRow } from './rate-card-model';

/** The day it is in the workshop, and the card it works with on that day. */
export interface CardsToday {
  readonly day: string;
  readonly inForceId: string | null;
}

/** Where a card stands on a day. */
function stateOf({ id, inForceFrom }: RateCardHead, today: CardsToday): RateCardState {
  if (inForceFrom === null) return 'draft';
  if (inForceFrom > today.day) return 'set';
  return id === today.inForceId ? 'in-force' : 'past';
}

export const presentRateCard = (row: RateCardHead, today: CardsToday): RateCardSummary => ({
  id: row.id,
  version: row.version,
  name: row.name,
  state: stateOf(row, today),
  from: row.inForceFrom,
  basedOnId: row.basedOnId,
  changedAt: row.changedAt.toISOString(),
});

export const presentWholeRateCard = (row: RateCardRow, today: CardsToday): WholeRateCard => ({
  ...presentRateCard(row, today),
  content: row.content as WholeRateCard['content'],
});
