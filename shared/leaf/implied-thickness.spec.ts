import { caratOf } from '#shared/leaf/carat-of';
import { alloyDensity, impliedThickness, thicknessFindings } from '#shared/leaf/implied-thickness';
import { startLeaf } from '#shared/leaf/start-leaf';

const product = (id: string) => startLeaf.products.find((known) => known.id === id)!;

describe('caratOf', () => {
  it.each([
    ['pure gold', { gold: 7 }, 24],
    ['half silver', { gold: 1, silver: 1 }, 12],
    ['no gold at all', { silver: 1 }, 0],
  ])('%s', (_sentence, alloy, carat) => {
    expect(caratOf(alloy)).toBe(carat);
  });

  it('refuses an alloy of nothing', () => {
    expect(() => caratOf({})).toThrow(RangeError);
  });
});

describe('impliedThickness', () => {
  it('mixes metals by volume: half gold, half silver by weight', () => {
    expect(alloyDensity({ gold: 1, silver: 1 })).toBeCloseTo(13.5972, 4);
    expect(alloyDensity({ gold: 3 })).toBeCloseTo(19.32, 12);
  });

  it.each([
    ['gold-23-5-loose', 0.124],
    ['palladium-loose', 0.156],
    ['silver-loose', 0.296],
    ['composition-loose', 0.591],
    ['aluminium-loose', 0.472],
  ])('%s is about as thick as its metal is beaten', (id, expected) => {
    expect(impliedThickness(product(id))).toBeCloseTo(expected, 3);
  });

  it('finds nothing wrong with any leaf of the start card', () => {
    expect(startLeaf.products.flatMap(thicknessFindings)).toEqual([]);
  });

  it.each([
    ['stated right', 0.12, []],
    ['stated a quarter too thin', 0.093, ['leaf-thickness-differs']],
    ['stated a quarter too thick', 0.155, ['leaf-thickness-differs']],
    ['not stated', null, []],
  ])('a leaf of 0.124 µm, %s', (_sentence, thickness_micrometres, codes) => {
    const stated = { ...product('gold-23-5-loose'), thickness_micrometres };
    expect(thicknessFindings(stated).map(({ code }) => code)).toEqual(codes);
  });

  it.each([
    ['gold-23-5-loose', 5],
    ['gold-23-5-loose', 80],
    ['palladium-loose', 3],
    ['silver-loose', 8],
    ['composition-loose', 25],
    ['aluminium-loose', 110],
  ])('%s of %d g per thousand is out of reach', (id, gramsPerThousand) => {
    expect(thicknessFindings({ ...product(id), gramsPerThousand }).map(({ code }) => code)).toEqual([
      'leaf-thickness-outside',
    ]);
  });
});
