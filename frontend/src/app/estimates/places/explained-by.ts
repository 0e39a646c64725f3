import type { Reason } from '#shared/words/reason';
import type { Formats } from '../../core/formats/formats';
import type { Words } from '../../core/formats/words';
import type { Explained } from '../../ui/figure/explained';

/** What words and figures are written with. */
export interface Writers {
  readonly formats: Formats;
  readonly words: Words;
}

/** A figure with its reasons, the last of which is the figure itself and stands below them as their sum. */
export function explainedBy(
  { id, heading, reasons }: { readonly id: string; readonly heading: string; readonly reasons: readonly Reason[] },
  { formats, words }: Writers,
): Explained {
  const last = reasons.at(-1);
  if (!last || typeof last.figure === 'string') return { id, heading, reasons };
  const figure = last.unit === 'number' ? formats.number(last.figure, 1, 1) : formats.figure(last.unit, last.figure);
  return { id, heading, reasons: reasons.slice(0, -1), total: { label: words.say(last.code, last.values), figure } };
}
