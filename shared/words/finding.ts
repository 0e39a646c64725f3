import type { WordCode, WordValues } from '#shared/words/word-code';

/**
 * What a calculation has to tell about its input: `refuse` (trade rules forbid it, an issue is stopped), `missing` (a fact is not
 * in the rate card), `warn`, `caution` (it can hurt somebody) or `note`.
 */
export type FindingKind = 'refuse' | 'missing' | 'warn' | 'caution' | 'note';

/** One finding, with the id of the member, zone or ornament it speaks of where there is one. */
export interface Finding {
  readonly kind: FindingKind;
  readonly code: WordCode;
  readonly values: WordValues;
  readonly about?: string;
}
