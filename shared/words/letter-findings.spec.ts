import { letterFindings } from '#shared/words/letter-findings';
import { unprintedLetters } from '#shared/words/unprinted-letters';

it.each<[string, string, readonly string[]]>([
  ['Latin in its European spellings', 'Žofie, Łukasz, Þór, İpek, Ștefan, ñ ç ß ẞ œ', []],
  ['Greek and Cyrillic', 'Ευαγγελία Παππά, Київ, Щедрин', []],
  ['figures and signs of the trade', '2′ 9⅞″ × 14 – £3.50 €7 ± 5 % ½ “x”, №4, 23½ ct …', []],
  ['a text with line ends, tabs and soft joiners', 'one\r\ntwo\tthree\u00adfour\u200bfive\u202f5\u20116', []],
  ['an accent typed by itself, which is joined to its letter', 'cafe\u0301', []],
  ['Hebrew', 'הזהב ab', ['ה', 'ז', 'ב']],
  ['Arabic', 'ذهب', ['ذ', 'ه', 'ب']],
  ['Chinese and Japanese', '金箔 leaf 金', ['金', '箔']],
  ['pictures, joined ones in their parts as a paper would set them', 'well 👍🏽 done 👩‍🎨', ['👍🏽', '👩', '🎨']],
])('%s', (_about, text, letters) => {
  expect(unprintedLetters(text).join(' ')).toBe(letters.join(' '));
});

it('warns of each text by its name and letters, and of none that can be printed', () => {
  const texts = [
    { part: 'title', name: '', text: 'Pier table' },
    { part: 'member', name: 'רגל', text: 'רגל', about: 'one' },
  ];
  expect(letterFindings(texts)).toEqual([
    {
      kind: 'warn',
      code: 'letters-not-printed',
      values: { part: 'member', name: 'רגל', letters: 'ר ג ל', more: 0 },
      about: 'one',
    },
  ]);
});

it('names eight letters and counts the rest', () => {
  const [{ values }] = letterFindings([{ part: 'terms', name: '', text: 'אבגדהוזחטיכ' }]);
  expect(values).toEqual({ part: 'terms', name: '', letters: 'א ב ג ד ה ו ז ח', more: 3 });
});
