/** A piece of a letter's words: plain text, a placeholder, or a brace that belongs to none. */
export type LetterPiece =
  | { readonly is: 'text'; readonly text: string }
  | { readonly is: 'placeholder'; readonly name: string }
  | { readonly is: 'brace'; readonly text: string };

const parts = /\{([^{}]*)\}|[{}]|[^{}]+/g;

/** Takes the words of a letter apart into text, placeholders in braces and lone braces, in order; nothing is lost. */
export function letterPieces(template: string): LetterPiece[] {
  return [...template.matchAll(parts)].map(([text, name]): LetterPiece => {
    if (name !== undefined) return { is: 'placeholder', name };
    return text === '{' || text === '}' ? { is: 'brace', text } : { is: 'text', text };
  });
}
