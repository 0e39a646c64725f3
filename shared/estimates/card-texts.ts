import type { RateCard } from '#shared/rate-cards/rate-card';
import type { TextOnPaper } from '#shared/words/letter-findings';

function namesIn(value: unknown): string[] {
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]: [string, unknown]) =>
    key === 'name' && typeof inner === 'string' ? [inner] : namesIn(inner),
  );
}

/** Every name a rate card gives to what may stand on a paper: timbers, ornaments, leaf, build-ups and their steps, taxes. */
export const cardTexts = (card: RateCard): TextOnPaper[] =>
  [...new Set(namesIn(card))].map((name) => ({ part: 'card', name, text: name }));
