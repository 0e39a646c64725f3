import { leafCardSchema, leafProductSchema } from '#shared/leaf/leaf-card-schema';
import { startLeaf } from '#shared/leaf/start-leaf';
import { complaintsOf } from '#shared/problems/complaints-of';

const [gold] = startLeaf.products;

const complaints = (changed: object): string[] => {
  const read = leafProductSchema.safeParse({ ...gold, ...changed });
  return read.success ? [] : complaintsOf(read.error).map(({ path, code }) => `${path.join('.')} ${code}`);
};

describe('leafCardSchema', () => {
  it('takes the start card as it stands', () => {
    expect(leafCardSchema.parse(startLeaf)).toEqual(startLeaf);
  });

  it.each([
    ['ribbon says how long a roll is', { form: 'ribbon' }, ['ribbon_mm leaf-ribbon-length']],
    ['leaves have no length', { ribbon_mm: 20_000 }, ['ribbon_mm leaf-no-ribbon']],
    ['an alloy has something in it', { alloy: { gold: 0 } }, ['alloy leaf-alloy-empty']],
    ['a leaf costs something', { price: '0.00' }, ['price entry-not-above']],
    ['a price is a decimal text', { price: '52,00' }, ['price entry-not-decimal']],
    [
      'a pack is more than a booklet',
      { breaks: [{ booklets: 1, off_percent: '5' }] },
      ['breaks.0.booklets entry-too-small'],
    ],
    [
      'a pack size stands once',
      {
        breaks: [
          { booklets: 20, off_percent: '5' },
          { booklets: 20, off_percent: '6' },
        ],
      },
      ['breaks.1.booklets leaf-pack-twice'],
    ],
    ['nothing else is taken', { colour: 'red' }, ['colour entry-unknown']],
  ])('%s', (_sentence, changed, expected) => {
    expect(complaints(changed)).toEqual(expected);
  });

  it('keeps losses in order and breakage at nine tenths', () => {
    const withBreakage = (low: number, likely: number, high: number) => ({
      ...startLeaf,
      losses: { ...startLeaf.losses, lays: { ...startLeaf.losses.lays, breakage_percent: { low, likely, high } } },
    });
    const told = (low: number, likely: number, high: number) =>
      complaintsOf(leafCardSchema.safeParse(withBreakage(low, likely, high)).error!).map(
        ({ path, code }) => `${path.join('.')} ${code}`,
      );
    expect(told(4, 5, 95)).toEqual(['losses.lays.breakage_percent.high entry-too-large']);
    expect(told(50, 40, 60)).toEqual(['losses.lays.breakage_percent.low triple-low-above']);
    expect(told(3, 5, 4)).toEqual(['losses.lays.breakage_percent.high triple-high-below']);
  });
});
