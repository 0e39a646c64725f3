import type { WordCode, WordValues } from '#shared/words/word-code';

/** One thing wrong with an entry: where it stands, and what to say about it. */
export interface Complaint {
  readonly path: readonly (string | number)[];
  readonly code: WordCode;
  readonly values: WordValues;
}
