import type { Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** What a measured line is paid by, its quantity as it is written, and the measures it is the sum of; nothing of what one of it costs. */
interface MeasuredLine {
  readonly quantity: string;
  readonly unit: string;
  readonly rule: string;
  readonly measures: readonly Pick<Reason, 'code' | 'values'>[];
}

/** What stands under a line of measured work, in the words of a reader. */
export function measuredNote(
  { measures, ...paid }: MeasuredLine,
  say: (code: WordCode, values?: WordValues) => string,
): string {
  const work = say('paper-measured-work', paid);
  if (measures.length === 0) return work;
  return say('paper-measures', { work, measures: measures.map(({ code, values }) => say(code, values)).join('; ') });
}
