import fc from 'fast-check';
import type { PriceInput, PriceLabour } from '#shared/estimates/price/price-input';
import { priceOf } from '#shared/estimates/price/price-of';
import { sectionsByKind, sectionsByMember } from '#shared/estimates/price/price-sections';
import type { ExtraLine } from '#shared/estimates/settings';
import { sumMinor } from '#shared/money/sum-minor';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';
import { formatsFor } from '#shared/units/formats-for';

const card: PriceInput['card'] = {
  grades: [
    { id: 'carver', name: 'Carver', costPerHour: '31' },
    { id: 'gilder', name: 'Gilder', costPerHour: '33' },
  ],
  overhead: { way: 'per-hour', perHour: '14.50' },
  consumables_percent: '4',
  taxCategories: [
    { id: 'standard', name: 'Standard', code: 'S', percent: '20', exemptionReason: '' },
    { id: 'reduced', name: 'Reduced', code: 'S', percent: '10', exemptionReason: '' },
    { id: 'export', name: 'Export', code: 'G', percent: '0', exemptionReason: 'Export' },
  ],
};

const leg: PriceInput = {
  digits: 2,
  card,
  profit: { way: 'margin', percent: '18' },
  contingency: { way: 'share', percent: '8' },
  discount: null,
  taxCategoryId: 'standard',
  memberIds: ['leg'],
  labour: [
    { memberId: 'leg', kind: 'carving', gradeId: 'carver', hours: 10 },
    { memberId: 'leg', kind: 'gilding', gradeId: 'gilder', hours: 5 },
  ],
  goods: [
    {
      head: 'leaf',
      itemId: 'gold',
      name: 'Gold',
      cost: '156',
      shares: [{ memberId: 'leg', kind: 'gilding', weight: 61.5 }],
    },
  ],
  extras: [],
};

const extra = (more: Partial<ExtraLine> & Pick<ExtraLine, 'kind'>): ExtraLine =>
  ({
    id: 'extra',
    name: 'Extra',
    taxCategoryId: 'standard',
    memberId: null,
    alternativeId: null,
    ...more,
  }) as ExtraLine;

const withExtras = (...extras: ExtraLine[]): PriceInput => ({ ...leg, extras });
const priceAt = (input: PriceInput, id: string) =>
  priceOf(input).client.lines.find((line) => line.id === id)?.price_minor;

describe('the price of a line', () => {
  it('comes from what stands on it: labour, consumables, goods, overhead, contingency, profit, rounded once', () => {
    // Carving: 310.00 + 12.40 = 322.40 direct, 145.00 overhead, 25.792 contingency, 493.192 ÷ 0.82 = 601.4537.
    // Gilding: 165.00 + 6.60 + 156.00 = 327.60 direct, 72.50 overhead, 26.208 contingency, 426.308 ÷ 0.82 = 519.8878.
    expect(priceOf(leg).client).toMatchObject({
      lines: [
        { id: 'leg/carving', memberId: 'leg', kind: 'carving', price_minor: 601_45 },
        { id: 'leg/gilding', memberId: 'leg', kind: 'gilding', price_minor: 519_89 },
      ],
      subtotal_minor: 1121_34,
      net_minor: 1121_34,
      taxes: [{ taxCategoryId: 'standard', net_minor: 1121_34, tax_minor: 224_27 }],
      gross_minor: 1345_61,
    });
  });

  it('shows the cost under its heads and what is left', () => {
    expect(priceOf(leg).cost).toMatchObject({
      heads: [
        { head: 'labour', itemId: 'carver', hours: 10, cost_minor: 310_00 },
        { head: 'labour', itemId: 'gilder', hours: 5, cost_minor: 165_00 },
        { head: 'leaf', itemId: 'gold', cost_minor: 156_00 },
        { head: 'consumables', itemId: null, cost_minor: 19_00 },
      ],
      hours: 15,
      direct_minor: 650_00,
      overhead_minor: 217_50,
      contingency_minor: 52_00,
      cost_minor: 919_50,
      margin_percent: 18,
      markUp_percent: 21.9512,
      profit_minor: 201_84,
      marginLeft_percent: 17.9999,
      markUpLeft_percent: 21.9511,
    });
  });

  it.each([
    [{ way: 'mark-up', percent: '25' } as const, 616_49],
    [{ way: 'margin', percent: '20' } as const, 616_49],
    [{ way: 'margin', percent: '25' } as const, 657_59],
    [{ way: 'margin', percent: '0' } as const, 493_19],
  ])('with %j the carving comes to %d', (profit, expected) => {
    expect(priceAt({ ...leg, profit }, 'leg/carving')).toBe(expected);
  });

  it('takes overhead as a share of labour where the workshop does', () => {
    // 310 + 12.40 + 25.792 + 50 % of 310 = 503.192 ÷ 0.82 = 613.6488.
    const share = { ...card, overhead: { way: 'share-of-labour', percent: '50' } as const };
    expect(priceAt({ ...leg, card: share }, 'leg/carving')).toBe(613_65);
  });

  it('takes hours to six decimals and joins those of one grade', () => {
    const thirds: PriceLabour[] = [1 / 3, 1 / 3, 1 / 3].map((hours) => ({
      memberId: null,
      kind: 'carving',
      gradeId: 'carver',
      hours,
    }));
    const whole: PriceLabour[] = [{ memberId: null, kind: 'carving', gradeId: 'carver', hours: 1 }];
    expect(priceOf({ ...leg, labour: thirds, goods: [] }).client).toEqual(
      priceOf({ ...leg, labour: whole, goods: [] }).client,
    );
  });

  it('counts in whole yen where the currency has no smaller unit', () => {
    expect(priceAt({ ...leg, digits: 0 }, 'leg/carving')).toBe(601);
  });
});

describe('goods bought for the whole job', () => {
  it('are shared out to the cent over the lines that use them', () => {
    const shares = ['a', 'b', 'c'].map((memberId) => ({ memberId, kind: 'gilding' as const, weight: 1 }));
    const goods = [{ head: 'leaf' as const, itemId: 'gold', name: 'Gold', cost: '1000.00', shares }];
    const lines = priceOf({ ...leg, labour: [], goods }).cost.lines;
    expect(lines.map((line) => line.direct_minor)).toEqual([333_34, 333_33, 333_33]);
  });

  it('belong to the job as a whole when nothing says where they go', () => {
    const goods = [{ head: 'materials' as const, itemId: 'bole', name: 'Bole', cost: '82', shares: [] }];
    expect(priceOf({ ...leg, labour: [], goods }).client.lines).toMatchObject([
      { id: 'general/other', price_minor: 108_00 },
    ]);
  });
});

describe('extra lines', () => {
  it.each([
    ['labour', extra({ kind: 'labour', gradeId: 'carver', hours: 10, work: 'packing' }), 601_45],
    ['bought-in work', extra({ kind: 'bought-in', cost: '82' }), 108_00],
    [
      'timber with a quarter of waste',
      extra({ kind: 'timber', volume_dm3: 10, price_per_dm3: '6.56', waste_percent: 25 }),
      108_00,
    ],
    [
      'a paid quantity at its own rate',
      extra({ kind: 'paid-quantity', rule: 'as measured', quantity: '12', unit: 'FTK', price: '4.005' }),
      48_06,
    ],
    ['a free line at its own price', extra({ kind: 'price', price: '-20' }), -20_00],
    ['insurance of a value given', extra({ kind: 'insurance', percent: '0.4', value: '20500' }), 108_00],
  ])('%s is a line of its own', (_name, line, expected) => {
    expect(priceAt(withExtras(line), 'extra')).toBe(expected);
    expect(priceAt(withExtras(line), 'leg/carving')).toBe(601_45);
  });

  it('insure the price they are part of, without going round in circles', () => {
    // load = 0.4 % × 1.08 ÷ 0.82; V = 1121.34 ÷ (1 − load) = 1127.2788; the line is V × load = 5.9388.
    const insured = priceOf(withExtras(extra({ kind: 'insurance', percent: '0.4', value: null })));
    expect(insured.client).toMatchObject({ subtotal_minor: 1127_28 });
    expect(insured.cost.heads.at(-1)).toMatchObject({ head: 'insurance', cost_minor: 4_51 });
  });

  it('refuse an insurance that would eat the price up', () => {
    const findings = priceOf(withExtras(extra({ kind: 'insurance', percent: '90', value: null }))).findings;
    expect(findings).toMatchObject([{ kind: 'refuse', code: 'price-insurance-over' }]);
  });

  it('with a price of their own have no cost behind them, and say so', () => {
    const price = priceOf(withExtras(extra({ kind: 'price', price: '100' })));
    expect(price.cost).toMatchObject({ priced_minor: 100_00, cost_minor: 919_50 });
  });
});

describe('discount, tax and lump sum', () => {
  it('takes a percentage off the sum of the lines, and shows the margin that is left', () => {
    const price = priceOf({ ...leg, discount: { way: 'percent', amount: '5' } });
    expect(price.client).toMatchObject({ subtotal_minor: 1121_34, discount_minor: 56_07, net_minor: 1065_27 });
    expect(price.cost).toMatchObject({ profit_minor: 145_77, marginLeft_percent: 13.6839 });
  });

  it('spreads a discount over tax categories by largest remainder', () => {
    const input = withExtras(extra({ kind: 'price', price: '1121.34', taxCategoryId: 'reduced' }));
    const { client } = priceOf({ ...input, discount: { way: 'amount', amount: '0.03' } });
    expect(client.taxes).toMatchObject([
      { taxCategoryId: 'standard', net_minor: 1121_32, tax_minor: 224_26 },
      { taxCategoryId: 'reduced', net_minor: 1121_33, tax_minor: 112_13 },
    ]);
    expect(client.gross_minor).toBe(2579_04);
  });

  it('spreads an agreed lump sum over the lines', () => {
    const { client } = priceOf({ ...leg, lumpSum: '1200' });
    expect(client.lines.map((line) => line.price_minor)).toEqual([643_64, 556_36]);
    expect(client.net_minor).toBe(1200_00);
  });

  it('owes nothing on exports', () => {
    expect(priceOf({ ...leg, taxCategoryId: 'export' }).client).toMatchObject({ tax_minor: 0, gross_minor: 1121_34 });
  });

  it('tells of a further line that comes to nothing, and where it stands', () => {
    const [empty, full] = ['0', '0.01'].map((price) => extra({ kind: 'price', price }));
    expect(priceOf(withExtras(full)).findings).toEqual([]);
    expect(priceOf(withExtras(empty)).findings).toEqual([
      { kind: 'warn', code: 'price-line-nothing', values: { line: 'Extra' }, about: 'extra' },
    ]);
  });

  it('tells what is missing, what is sold below cost and what would be below nothing', () => {
    const codes = (input: PriceInput) => priceOf(input).findings.map((finding) => finding.code);
    expect(codes(leg)).toEqual([]);
    expect(codes({ ...leg, labour: [{ ...leg.labour[0], gradeId: 'turner' }] })).toEqual(['price-grade-missing']);
    expect(codes({ ...leg, taxCategoryId: 'luxury' })).toEqual(['price-tax-missing']);
    expect(codes({ ...leg, discount: { way: 'percent', amount: '30' } })).toEqual(['price-below-cost']);
    expect(codes({ ...leg, discount: { way: 'amount', amount: '1121.35' } })).toEqual(['price-below-nothing']);
    expect(codes({ ...leg, labour: [], goods: [], lumpSum: '100' })).toEqual(['price-lump-sum-nowhere']);
  });

  it('may come below nothing by what its lines take away, and says so as no fault', () => {
    const plain = {
      kind: 'price',
      id: 'plain',
      name: 'Frieze stays plain',
      taxCategoryId: 'standard',
      memberId: null,
    } as const;
    const extras = [{ ...plain, alternativeId: null, price: '-420.00' }];
    const { client, findings } = priceOf({ ...leg, labour: [], goods: [], extras });
    expect(client).toMatchObject({ subtotal_minor: -420_00, net_minor: -420_00 });
    expect(findings.filter(({ code }) => code.startsWith('price-takes') || code.startsWith('price-below'))).toEqual([
      { kind: 'note', code: 'price-takes-away', values: { taken_minor: 420_00 } },
    ]);
  });

  it('is nothing for nothing', () => {
    const price = priceOf({ ...leg, labour: [], goods: [], discount: { way: 'percent', amount: '5' } });
    expect(price.client).toMatchObject({ lines: [], net_minor: 0, taxes: [], gross_minor: 0 });
    expect(price.cost).toMatchObject({ cost_minor: 0, marginLeft_percent: null, markUpLeft_percent: null });
  });

  it('refuses what a schema should have stopped', () => {
    expect(() => priceOf({ ...leg, profit: { way: 'margin', percent: '100' } })).toThrow(RangeError);
    expect(() => priceOf({ ...leg, labour: [{ ...leg.labour[0], hours: -1 }] })).toThrow(RangeError);
  });
});

describe('what a client may see', () => {
  it('has no word of cost, hours or margin in it', () => {
    const { client } = priceOf(withExtras(extra({ kind: 'insurance', percent: '0.4', value: null })));
    expect(JSON.stringify(client)).not.toMatch(/cost|hours|margin|markUp|overhead|contingency|profit|grade/i);
  });

  it('every reason can be worded, on both sides', () => {
    const tell = say(en, formatsFor({ locale: 'en-GB', currency: 'EUR', digits: 2, lengthUnit: 'mm' }));
    const price = priceOf(
      withExtras(extra({ kind: 'price', price: '5' }), extra({ kind: 'insurance', percent: '0.4', value: null })),
    );
    const reasons = [
      ...price.client.reasons,
      ...price.cost.reasons,
      ...price.cost.lines.flatMap((line) => line.reasons),
    ];
    const told = reasons.map((reason) => tell(reason.code, reason.values).replaceAll('\u00a0', ' '));
    expect(told).toContain('Carver: 10 h at €31.00 an hour');
    expect(told).toContain('Overhead: 15 h at €14.50 an hour');
    expect(told).toContain('Tax S: 20% of €1,132.31');
    expect(told).toContain('€493.19 with a margin of 18% of the price');
  });
});

describe('laws of the price', () => {
  const hours = fc.integer({ min: 0, max: 400_000 }).map((thousandths) => thousandths / 1000);
  const labour = fc.record({
    memberId: fc.constantFrom('leg', 'apron', 'foot', null),
    kind: fc.constantFrom('carving', 'ground', 'gilding', 'finishing', 'making'),
    gradeId: fc.constantFrom('carver', 'gilder'),
    hours,
  });
  const goods = fc.record({
    head: fc.constantFrom('leaf', 'materials'),
    itemId: fc.constantFrom('gold', 'bole'),
    name: fc.constant('Goods'),
    cost: fc.integer({ min: 0, max: 1_000_000 }).map((cents) => (cents / 100).toFixed(2)),
    shares: fc.array(
      fc.record({
        memberId: fc.constantFrom('leg', 'apron'),
        kind: fc.constantFrom('gilding', 'ground'),
        weight: fc.nat(1000),
      }),
      { maxLength: 3 },
    ),
  });
  const inputs: fc.Arbitrary<PriceInput> = fc
    .record({
      labour: fc.array(labour, { minLength: 1, maxLength: 10 }),
      goods: fc.array(goods, { maxLength: 3 }),
      profit: fc.record({ way: fc.constantFrom('margin', 'mark-up'), percent: fc.nat(90).map(String) }),
      contingency: fc.oneof(
        fc.nat(30).map((percent) => ({ way: 'share' as const, percent: String(percent) })),
        fc.nat(1_000_000).map((amount_minor) => ({ way: 'risk' as const, amount_minor })),
      ),
      discount: fc.option(fc.record({ way: fc.constant('percent' as const), amount: fc.nat(30).map(String) })),
      insured: fc.boolean(),
    })
    .map(({ insured, ...some }) => ({
      ...leg,
      ...some,
      extras: [
        extra({ id: 'boards', kind: 'price', price: '17.35', taxCategoryId: 'reduced' }),
        ...(insured ? [extra({ id: 'cover', kind: 'insurance', percent: '0.4', value: null })] : []),
      ],
    }));

  it('a price spread over sections adds up, whichever way it is cut', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { client } = priceOf(input);
        expect(sumMinor(sectionsByMember(client.lines).map((section) => section.price_minor))).toBe(
          client.subtotal_minor,
        );
        expect(sumMinor(sectionsByKind(client.lines).map((section) => section.price_minor))).toBe(
          client.subtotal_minor,
        );
        expect(sumMinor(client.lines.map((line) => line.price_minor))).toBe(client.subtotal_minor);
        expect(sumMinor(client.taxes.map((tax) => tax.net_minor))).toBe(client.net_minor);
        expect(client.subtotal_minor - client.discount_minor).toBe(client.net_minor);
        expect(client.net_minor + client.tax_minor).toBe(client.gross_minor);
      }),
    );
  });

  it('cost adds up by heads and by lines, and contingency from risk is there to the cent', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        const { cost } = priceOf(input);
        expect(sumMinor(cost.heads.map((head) => head.cost_minor))).toBe(cost.direct_minor);
        expect(sumMinor(cost.lines.map((line) => line.cost_minor))).toBe(cost.cost_minor);
        const { contingency } = input;
        if (contingency.way === 'risk' && cost.direct_minor > 0)
          expect(cost.contingency_minor).toBe(contingency.amount_minor);
      }),
    );
  });

  it('an hour more moves its own line alone, and insurance of the price', () => {
    fc.assert(
      fc.property(inputs, fc.nat(9), (input, place) => {
        fc.pre(input.contingency.way === 'share');
        const entry = input.labour[place % input.labour.length];
        const own = `${entry.memberId ?? 'general'}/${entry.kind}`;
        const more = { ...input, labour: [...input.labour, { ...entry, hours: 1 }] };
        const others = (of: PriceInput) =>
          priceOf(of).client.lines.filter((line) => line.id !== own && line.id !== 'cover');
        expect(others(more)).toEqual(others(input));
        expect(priceAt(more, own)).toBeGreaterThan(priceAt(input, own) ?? 0);
      }),
    );
  });

  it('more cost is never a lower price', () => {
    fc.assert(
      fc.property(inputs, fc.nat(9), hours, (input, place, added) => {
        const entry = input.labour[place % input.labour.length];
        const more = { ...input, labour: [...input.labour, { ...entry, hours: added }] };
        const [before, after] = [priceOf(input).client, priceOf(more).client];
        // From risk the same amount is shared out anew, and each line may round the other way by half a cent.
        const slack = input.contingency.way === 'risk' ? before.lines.length : 0;
        expect(after.net_minor).toBeGreaterThanOrEqual(before.net_minor - slack);
        expect(after.gross_minor).toBeGreaterThanOrEqual(before.gross_minor - 2 * slack);
      }),
    );
  });

  it('insurance of the price is its share of the whole, to the cent', () => {
    fc.assert(
      fc.property(inputs, (input) => {
        fc.pre(input.contingency.way === 'share' && input.extras.some((line) => line.kind === 'insurance'));
        const { client, cost } = priceOf(input);
        const insurance = cost.heads.find((head) => head.head === 'insurance')?.cost_minor ?? 0;
        expect(Math.abs(insurance * 250 - client.subtotal_minor)).toBeLessThanOrEqual(253);
      }),
    );
  });

  it('an agreed lump sum is the price to the cent', () => {
    fc.assert(
      fc.property(inputs, fc.integer({ min: 1, max: 100_000_000 }), (input, cents) => {
        const { client } = priceOf({ ...input, lumpSum: (cents / 100).toFixed(2) });
        expect(client.subtotal_minor).toBe(cents);
      }),
    );
  });
});
