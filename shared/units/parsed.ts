import type { WordCode, WordValues } from '#shared/words/word-code';

/** What reading a typed entry gives: its value, or what to say about it. */
export type Parsed<T> = ({ readonly ok: true } & Readonly<T>) | Unread;

export interface Unread {
  readonly ok: false;
  readonly code: WordCode;
  readonly values: WordValues;
}

/** What could not be read, as a code of the catalogue with its values. */
export const unread = (code: WordCode, values: WordValues = {}): Unread => ({ ok: false, code, values });
