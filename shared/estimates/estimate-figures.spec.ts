import { emptyAlternatives } from '#shared/estimates/is-empty-alternative';
import { pricesOfOtherCurrency } from '#shared/estimates/prices-of-other-currency';
import type { EstimateInput } from '#shared/estimates/estimate-figures';
import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { EstimateSettings } from '#shared/estimates/settings';
import { startCard } from '#shared/rate-cards/start-card';
import { smallDraft } from '../../test/documents/sample-draft';

const input = (given: Partial<EstimateInput> = {}, settings: Partial<EstimateSettings> = {}): EstimateInput => ({
  ...{ draft: smallDraft(settings), choice: [], card: startCard, currency: 'EUR' },
  ...given,
});
const alternative = (id: string, replaces: readonly string[] = []) => ({ id, name: id, group: '', note: '', replaces });

describe('what is said of a draft before its price', () => {
  it('warns of start prices taken as another currency, hours and leaf each until they are one’s own', () => {
    const said = (card: typeof startCard, currency: string) =>
      pricesOfOtherCurrency(input({ card, currency })).map(({ values }) => values['of']);
    const { grades } = startCard.money;
    const ownHours = {
      ...startCard,
      money: { ...startCard.money, grades: grades.map((grade) => ({ ...grade, costPerHour: '5200' })) },
    };
    const { products } = startCard.leaf;
    const own = {
      ...ownHours,
      leaf: { ...startCard.leaf, products: products.map((one) => ({ ...one, price: '8100' })) },
    };
    expect(said(startCard, 'EUR')).toEqual([]);
    expect(said(startCard, 'JPY')).toEqual(['hours', 'leaf']);
    expect(said(ownHours, 'JPY')).toEqual(['leaf']);
    expect(said(own, 'JPY')).toEqual([]);
  });

  it('warns of own prices entered in another currency, until the card was changed since', () => {
    const { grades } = startCard.money;
    const ownIn = (currency?: string): typeof startCard => ({
      ...startCard,
      leaf: { ...startCard.leaf, products: startCard.leaf.products.map((one) => ({ ...one, price: '71.5' })) },
      money: { ...startCard.money, grades: grades.map((grade) => ({ ...grade, costPerHour: '52' })), currency },
    });
    const said = (card: typeof startCard, currency: string) =>
      pricesOfOtherCurrency(input({ card, currency })).map(({ code, values }) => [code, values['of'], values['start']]);
    expect(said(ownIn('EUR'), 'USD')).toEqual([
      ['card-other-currency', 'hours', 'EUR'],
      ['card-other-currency', 'leaf', 'EUR'],
    ]);
    expect(said(ownIn('USD'), 'EUR')).toHaveLength(2);
    expect(said(ownIn('USD'), 'USD')).toEqual([]);
    // A card of before this was written down: nobody knows, so nothing is said.
    expect(said(ownIn(), 'USD')).toEqual([]);
    // Hours are one’s own, leaf is as it began.
    const mixed = { ...ownIn('GBP'), leaf: startCard.leaf };
    expect(said(mixed, 'USD')).toEqual([
      ['card-other-currency', 'hours', 'GBP'],
      ['card-start-prices', 'leaf', 'EUR'],
    ]);
  });

  it('is told with the price, as a warning that stops nothing', () => {
    const figures = estimateFigures(prepareEstimate(input({ currency: 'JPY' })), null);
    const found = figures.cost.findings.filter(({ code }) => code === 'card-start-prices');
    expect(found.map(({ kind }) => kind)).toEqual(['warn', 'warn']);
  });

  it('names the alternatives that hold nothing and leave nothing out', () => {
    const settings = {
      alternatives: [alternative('bare'), alternative('less', ['stretcher-all']), alternative('crate')],
    };
    const extras = [
      {
        id: 'x',
        name: 'Crate',
        taxCategoryId: 'standard',
        memberId: null,
        alternativeId: 'crate',
        kind: 'price',
        price: '9',
      },
    ] as const;
    const found = emptyAlternatives(input({}, { ...settings, extras }).draft);
    expect(found.map(({ kind, code, about }) => [kind, code, about])).toEqual([['warn', 'alternative-empty', 'bare']]);
  });
});

describe('lines', () => {
  it('stand in the order of the members, whether there is carving on them or not', () => {
    const draft = smallDraft();
    const order = (members: typeof draft.members) => {
      const { price } = estimateFigures(prepareEstimate(input({ draft: { ...draft, members } })), null);
      return [...new Set(price.lines.flatMap(({ memberId }) => memberId ?? []))];
    };
    expect(order(draft.members)).toEqual(draft.members.map(({ id }) => id));
    const turned = draft.members.toReversed();
    expect(order(turned)).toEqual(turned.map(({ id }) => id));
  });
});

describe('a lump sum', () => {
  const agreed = (choice: readonly string[], settings: Partial<EstimateSettings> = {}) => {
    const extras = [
      {
        id: 'x',
        name: 'Crate',
        taxCategoryId: 'standard',
        memberId: null,
        alternativeId: 'crate',
        kind: 'price',
        price: '90',
      },
    ] as const;
    const profit = { way: 'lump-sum', amount: '5000' } as const;
    const given = { profit, extras, alternatives: [alternative('crate')], ...settings };
    return estimateFigures(prepareEstimate(input({ choice }, given)), null);
  };

  it('is what the lines come to, to the last cent, and what is left of it is shown as margin', () => {
    const { price, cost } = agreed([]);
    expect([price.subtotal_minor, price.net_minor]).toEqual([500_000, 500_000]);
    expect(price.lines.reduce((sum, { price_minor }) => sum + price_minor, 0)).toBe(500_000);
    expect(cost.price.profit_minor).toBe(500_000 - cost.price.cost_minor);
  });

  it('was agreed for the base: an alternative adds what it is worked at', () => {
    expect(agreed(['crate']).price.net_minor).toBe(509_000);
  });

  it('has its discount taken off after', () => {
    expect(agreed([], { discount: { way: 'amount', amount: '100' } }).price.net_minor).toBe(490_000);
  });
});

describe('a discount above the price', () => {
  it('leaves no margin to speak of', () => {
    const { cost, price } = estimateFigures(
      prepareEstimate(input({}, { discount: { way: 'amount', amount: '99999' } })),
      null,
    );
    expect(price.net_minor).toBeLessThan(0);
    expect(cost.price.marginLeft_percent).toBeNull();
    expect(cost.price.reasons.map(({ code }) => code)).not.toContain('price-margin-left');
  });
});
