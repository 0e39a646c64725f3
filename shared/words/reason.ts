import type { WordCode, WordValues } from '#shared/words/word-code';

/** The unit a worked figure is shown in; the reader's own units and currency are applied when it is worded. */
export type FigureUnit =
  | 'number'
  | 'factor'
  | 'divisor'
  | 'percent'
  | 'leaves'
  | 'booklets'
  | 'pieces'
  | 'mm'
  | 'mm2'
  | 'µm'
  | 'grams'
  | 'litres'
  | 'hours'
  | 'minutes'
  | 'minor'
  | 'celsius'
  | 'text';

/** One step of an explanation: what was done, with what, and what came out. `house` names the rate-card value used. */
export interface Reason {
  readonly code: WordCode;
  readonly values: WordValues;
  readonly figure: number | string;
  readonly unit: FigureUnit;
  readonly house?: string;
}
