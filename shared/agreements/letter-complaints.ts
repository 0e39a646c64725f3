import { letterPlaceholders, neededPlaceholders, type LetterKind } from '#shared/agreements/letter-kinds';
import { letterPieces } from '#shared/agreements/letter-pieces';
import type { Complaint } from '#shared/problems/complaint';

/** A subject and a text, with placeholders in braces. */
export interface LetterText {
  readonly subject: string;
  readonly text: string;
}

function complaintsOfEntry(kind: LetterKind, entry: keyof LetterText, template: string): Complaint[] {
  const known = letterPlaceholders[kind];
  const shown = known.map((name) => `{${name}}`).join(' ');
  return letterPieces(template).flatMap((piece): Complaint[] => {
    if (piece.is === 'brace') return [{ path: [entry], code: 'letter-brace-alone', values: {} }];
    if (piece.is !== 'placeholder' || known.includes(piece.name)) return [];
    return [
      { path: [entry], code: 'letter-placeholder-unknown', values: { name: piece.name.slice(0, 40), known: shown } },
    ];
  });
}

/** What is wrong with the words of a letter: braces that hold nothing known, and what the letter is of no use without. */
export function letterComplaints(kind: LetterKind, words: LetterText): Complaint[] {
  const named = letterPieces(words.text).flatMap((piece) => (piece.is === 'placeholder' ? [piece.name] : []));
  const missing = neededPlaceholders[kind].filter((name) => !named.includes(name));
  return [
    ...complaintsOfEntry(kind, 'subject', words.subject),
    ...complaintsOfEntry(kind, 'text', words.text),
    ...missing.map((name): Complaint => ({ path: ['text'], code: 'letter-placeholder-needed', values: { name } })),
  ];
}
