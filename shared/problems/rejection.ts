import type { Complaint } from '#shared/problems/complaint';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** The kinds of refusal a request can meet; each has one HTTP status, named in `problem-schema.ts`. */
export type RejectionKind =
  | 'invalid'
  | 'signed-out'
  | 'not-allowed'
  | 'not-found'
  | 'gone'
  | 'conflict'
  | 'stale'
  | 'too-large'
  | 'unsupported'
  | 'unprocessable'
  | 'too-many'
  | 'unavailable';

/** A business refusal: the one exception services throw on purpose. `detail` is sent beside the problem (both sides of a conflict). */
export class Rejection extends Error {
  override readonly name = 'Rejection';

  constructor(
    readonly kind: RejectionKind,
    readonly code: WordCode,
    readonly more: {
      readonly values?: WordValues;
      readonly complaints?: readonly Complaint[];
      readonly detail?: unknown;
      readonly retryAfter_seconds?: number;
    } = {},
  ) {
    super(code);
  }
}
