import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import type { KnownEffects } from './card-effects-service';

/** What is known of a card's effects; they are current while the card has not changed since. */
export function presentCardEffects({ card, row }: KnownEffects): CardEffectsAnswer {
  if (!row) return { state: 'none', isCurrent: false, worked: 0, total: 0, workedAt: null, effects: [] };
  return {
    state: row.state,
    isCurrent: row.cardVersion === card.version,
    worked: row.worked,
    total: row.total,
    workedAt: row.workedAt?.toISOString() ?? null,
    effects: row.effects as CardEffectsAnswer['effects'],
  };
}
