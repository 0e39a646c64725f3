import type { Finding } from '#shared/words/finding';
import { unprintedLetters } from '#shared/words/unprinted-letters';

/** A text that stands on a paper. `part` says which one, as the catalogue names it, and `name` whose it is. */
export interface TextOnPaper {
  readonly part: string;
  readonly name: string;
  readonly text: string;
  readonly about?: string;
}

/** So many letters are named; the rest is counted. */
const most = 8;

function findingOf({ part, name, text, about }: TextOnPaper): Finding[] {
  const letters = unprintedLetters(text);
  if (letters.length === 0) return [];
  const values = { part, name, letters: letters.slice(0, most).join(' '), more: Math.max(0, letters.length - most) };
  return [{ kind: 'warn', code: 'letters-not-printed', values, ...(about === undefined ? {} : { about }) }];
}

/** A warning for each text with letters that the fonts of the papers do not have, naming text and letters. */
export const letterFindings = (texts: readonly TextOnPaper[]): Finding[] => texts.flatMap(findingOf);
