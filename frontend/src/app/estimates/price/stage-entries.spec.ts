import { readStages, stageEntriesOf, type StageEntry } from './stage-entries';

const entries = (...shares: readonly string[]): StageEntry[] =>
  shares.map((share, index) => ({ id: `s${index}`, name: `Stage ${index}`, share }));

describe('readStages', () => {
  it.each([
    ['40, 60 is whole', ['40', '60'], [40, 60]],
    ['thirds with two decimals are whole', ['33.33', '33.33', '33.34'], [33.33, 33.33, 33.34]],
    ['the sign may be typed', ['40 %', '60%'], [40, 60]],
    ['none is one payment of all', [], []],
  ])('%s', (_, shares, percents) => {
    expect(readStages(entries(...shares), 'en-GB').stages?.map(({ percent }) => percent)).toEqual(percents);
  });

  it.each([
    ['what is missing', ['40', '35.5'], '24.5'],
    ['what is too much, below nought', ['80', '35'], '-15'],
    [
      'a hair too little, which a sum of floats would pass',
      ['33.333333333', '33.333333333', '33.333333333'],
      '0.000000001',
    ],
  ])('tells %s', (_, shares, missing) => {
    const read = readStages(entries(...shares), 'en-GB');
    expect([read.stages, read.missing_percent]).toEqual([undefined, missing]);
  });

  it('remarks a share nobody can read, one over the whole, and a stage without a name', () => {
    const read = readStages(
      [
        { id: 'a', name: 'Carving', share: '4o' },
        { id: 'b', name: ' ', share: '120' },
      ],
      'en-GB',
    );
    expect([...read.remarks.keys()]).toEqual(['a share', 'b name', 'b share']);
    expect(read.stages).toBeUndefined();
  });

  it('reads and writes with the decimal sign of the place', () => {
    const written = stageEntriesOf([{ id: 'a', name: 'Alles', percent: 12.5 }], 'de-DE');
    expect(written[0].share).toBe('12,5');
    expect(readStages([...written, { id: 'b', name: 'Rest', share: '87,5' }], 'de-DE').stages).toHaveLength(2);
  });
});
