import { mergedValues, type CardSide } from '#shared/rate-cards/merged-values';
import type { CardEntries } from '../rate-card-calls';

/** What two people entered into one draft, laid together, and the lines of it that one has to choose. */
export interface MergedEntries {
  readonly entries: CardEntries;
  readonly overlaps: readonly string[];
}

/** The name and the content of a draft, as both sides changed them since they were kept last. */
export function mergedEntries(
  sides: { readonly base: CardEntries; readonly mine: CardEntries; readonly theirs: CardEntries },
  sideOf: (key: string) => CardSide,
): MergedEntries {
  const { value, overlaps } = mergedValues(sides, sideOf);
  return { entries: value, overlaps: overlaps.map(({ key }) => key) };
}
