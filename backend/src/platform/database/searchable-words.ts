/** Letters that no decomposition of Unicode leads back to plain ones, as people type them who lack the key. */
const plainLetters: Readonly<Record<string, string>> = {
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ø: 'o',
  ł: 'l',
  đ: 'd',
  ð: 'd',
  þ: 'th',
  ı: 'i',
};

/** How many letters of a word are kept. */
const longestWord = 40;

const plain = (text: string): string =>
  text
    .toLowerCase()
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[ßæœøłđðþı]/g, (letter) => plainLetters[letter] ?? letter)
    .replace(/['’ʼ]/g, '');

/** The words of a text as lists are searched by them: small letters and figures without accents, each once. They hold nothing a pattern of SQL would read. */
export function searchableWords(text: string): string[] {
  const words = plain(text)
    .split(/[^\p{L}\p{N}]+/u)
    .filter((word) => word !== '');
  return [...new Set(words.map((word) => [...word].slice(0, longestWord).join('')))];
}
