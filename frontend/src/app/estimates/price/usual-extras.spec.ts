import { extraLineSchema } from '#shared/estimates/settings-schema';
import { startCard } from '#shared/rate-cards/start-card';
import { extraLinesOf, usualExtras } from './usual-extras';

const start = { card: startCard, taxCategoryId: 'reduced', timberId: 'oak' };
const lines = (usual: (typeof usualExtras)[number]) => extraLinesOf(usual, start);

describe('extraLinesOf', () => {
  it.each(usualExtras)(
    '%s makes lines that may be kept as they are, with ids of their own and the estimate’s tax',
    (usual) => {
      const made = [...lines(usual), ...lines(usual)];
      expect(made.map((line) => extraLineSchema.safeParse(line).success)).toEqual(made.map(() => true));
      expect(new Set(made.map(({ id }) => id)).size).toBe(made.length);
      expect(made.every(({ taxCategoryId }) => taxCategoryId === 'reduced')).toBe(true);
    },
  );

  it('takes a sample board as the card has it: five hours of a gilder, one booklet at its list price', () => {
    expect(lines('sample')).toMatchObject([
      { kind: 'labour', work: 'sample', gradeId: 'gilder', hours: 5 },
      { kind: 'bought-in', cost: startCard.leaf.products.find(({ id }) => id === 'gold-23-5-loose')?.price },
    ]);
  });

  it('takes packing with its crate, and fitting by two people for four hours', () => {
    expect(lines('packing')).toMatchObject([{ hours: 6, work: 'packing' }, { cost: '180.00' }]);
    expect(lines('fitting')).toMatchObject([{ hours: 8, work: 'fitting' }]);
  });

  it('takes the timber of the members, at its price and waste, and insurance on the price', () => {
    expect(lines('timber')).toMatchObject([{ price_per_dm3: '2.90', waste_percent: 40, volume_dm3: 0 }]);
    expect(lines('insurance')).toMatchObject([{ percent: '0.4', value: null }]);
  });
});
