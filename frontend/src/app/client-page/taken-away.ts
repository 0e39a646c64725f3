import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { Formats } from '../core/formats/formats';
import type { Words } from '../core/formats/words';

/** What a variation takes away, in words; empty where something is to be paid. */
export function takenAway(
  { words, formats }: { words: Words; formats: Formats },
  price: Pick<ClientIssue['price'], 'gross_minor' | 'tax_minor'> | undefined,
): string {
  if (!price || price.gross_minor >= 0) return '';
  const taxed = price.tax_minor === 0 ? 'no' : 'yes';
  return words.say('paper-takes-away', { amount: formats.money(-price.gross_minor), taxed });
}
