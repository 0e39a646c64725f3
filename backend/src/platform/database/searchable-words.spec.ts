import { assert, property, string } from 'fast-check';
import { searchableWords } from './searchable-words';

describe('The words of a text', () => {
  it.each([
    [
      'are parted by whatever is neither letter nor figure',
      'Pier-table, base (lime)',
      ['pier', 'table', 'base', 'lime'],
    ],
    ['lose accents and capitals', 'CRÉDENCE Übersee', ['credence', 'ubersee']],
    ['lose strokes and ligatures too', 'Łódź Ørsted Straße œuvre', ['lodz', 'orsted', 'strasse', 'oeuvre']],
    ['keep an apostrophe out of sight', "St John’s, O'Hara", ['st', 'johns', 'ohara']],
    ['stand once each', 'lion and lion and LION', ['lion', 'and']],
    ['are figures as well', '2026-014', ['2026', '014']],
    ['are written in any script', 'Жираф 金箔', ['жираф', '金箔']],
    ['write figures of other widths plainly', '１２ ½', ['12', '1', '2']],
    ['may be none', ' %_[]()+*? ', []],
    ['are cut after forty letters', 'a'.repeat(60), ['a'.repeat(40)]],
  ])('%s', (_sentence, text, words) => {
    expect(searchableWords(text)).toEqual(words);
  });

  it('hold nothing that SQL, a pattern or a regular expression would read', () => {
    assert(
      property(string({ unit: 'binary' }), (text) => {
        for (const word of searchableWords(text)) expect(word).toMatch(/^[\p{L}\p{N}]{1,40}$/u);
      }),
    );
  });

  it('are the same when taken again', () => {
    assert(
      property(string({ unit: 'grapheme' }), (text) => {
        const words = searchableWords(text);
        expect(searchableWords(words.join(' '))).toEqual(words);
      }),
    );
  });
});
