import { paidFor, paidText, type WorkMeasure } from '#shared/estimates/price/measured-work';
import type { PriceInput } from '#shared/estimates/price/price-input';
import { priceOf } from '#shared/estimates/price/price-of';
import { inverseDistribution } from '#shared/estimates/risk/inverse-distribution';
import type { MeasuringRule } from '#shared/measure/paid-quantity';
import { cashRounding, cashStep } from '#shared/money/cash-rounding';
import { D } from '#shared/money/decimal';
import { lineAmount, type PricedQuantity } from '#shared/money/line-amount';
import { marginOfMarkUp, markUpOfMargin } from '#shared/money/margin';
import { minorOf } from '#shared/money/minor-of';
import { percentOf } from '#shared/money/percent-of';
import { splitByLargestRemainder } from '#shared/money/split-by-largest-remainder';
import { stagePayments } from '#shared/money/stage-payments';
import { sumMinor } from '#shared/money/sum-minor';
import { taxByCategory, type TaxableAmount } from '#shared/money/tax-by-category';
import type { TaxCode } from '#shared/money/tax-codes';
import { textOf } from '#shared/money/text-of';

describe('mark-up and margin', () => {
  // Common practice: the table of equivalents printed in trade handbooks; arithmetic, no single source.
  it.each([
    ['10', 9.091],
    ['20', 16.667],
    ['25', 20],
    ['33.33333333333333333333', 25],
    ['50', 33.333],
    ['100', 50],
  ])('a mark-up of %s %% on cost is a margin of %d %% of price', (markUp, margin) => {
    expect(Math.abs(marginOfMarkUp(markUp).toNumber() - margin)).toBeLessThan(0.0005);
    expect(markUpOfMargin(marginOfMarkUp(markUp)).minus(markUp).abs().lessThan(1e-20)).toBe(true);
  });
});

describe('overhead by the direct hour', () => {
  // Common practice, no single source: 500,000 of overhead a year ÷ 25,000 direct hours.
  it('is 20 an hour, and a job of 100 h with 800 of materials and 1,200 of labour costs 4,000', () => {
    const perHour = new D(500_000).div(25_000).toString();
    expect(perHour).toBe('20');
    const job: PriceInput = {
      digits: 2,
      card: {
        grades: [{ id: 'hand', name: 'Hand', costPerHour: '12' }],
        overhead: { way: 'per-hour', perHour },
        consumables_percent: '0',
        taxCategories: [],
      },
      profit: { way: 'margin', percent: '0' },
      contingency: { way: 'share', percent: '0' },
      discount: null,
      taxCategoryId: 'none',
      memberIds: [],
      labour: [{ memberId: null, kind: 'carving', gradeId: 'hand', hours: 100 }],
      goods: [{ head: 'materials', itemId: 'sundry', name: 'Sundry', cost: '800', shares: [] }],
      extras: [],
    };
    const { cost } = priceOf(job);
    expect(cost).toMatchObject({ direct_minor: 2_000_00, overhead_minor: 2_000_00, cost_minor: 4_000_00 });
  });
});

describe('half up, away from zero', () => {
  // EN 16931's official examples with an exact half cent all round away from zero (ConnectingEurope/eInvoicing-EN16931,
  // test/testfiles/BIS_Billing_30-Tjanster_Kopiering.xml and others); the first two tell decimal from binary arithmetic.
  it.each([
    ['1.005', '1.01'],
    ['-2.005', '-2.01'],
    ['-156435.885', '-156435.89'],
    ['1253.105', '1253.11'],
  ])('%s becomes %s', (exact, rounded) => {
    expect(textOf(minorOf(exact, 2), 2)).toBe(rounded);
  });

  it('rounds 25 % of −625,743.54 to −156,435.89', () => {
    // The BIS 3 invoices of the same collection (ubl/examples/BIS3_Invoice_positive.XML) have it on both sides of nought.
    expect(percentOf(625_743_54, '25')).toBe(156_435_89);
    expect(percentOf(-625_743_54, '25')).toBe(-156_435_89);
  });
});

describe('stage payments', () => {
  // Common practice of building contracts, no single source.
  it('a contract of 20,000 valued at 30, 60 and 100 % with 5 % retention pays 5,700, 5,700, 7,600, then 500 and 500', () => {
    const payments = stagePayments(20_000_00, {
      deposit_percent: 0,
      stages_percent: [30, 30, 40],
      retention_percent: 5,
    });
    expect(payments.stages.map((stage) => stage.paid_minor)).toEqual([5_700_00, 5_700_00, 7_600_00]);
    expect(payments.releases_minor).toEqual([500_00, 500_00]);
  });

  it('thirds of 1,000.00 are 333.34, 333.33, 333.33', () => {
    expect(splitByLargestRemainder(1_000_00, [1, 1, 1])).toEqual([333_34, 333_33, 333_33]);
  });
});

describe('cash rounding', () => {
  // Step of the Swiss franc: Unicode CLDR, supplemental currency data. Cases: own arithmetic on it.
  it.each([
    [16_97, 16_95],
    [16_98, 17_00],
    [999_99, 1_000_00],
    [2, 0],
    [19_32, 19_30],
  ])('%d centimes are paid as %d', (due, paid) => {
    expect(cashRounding(due, cashStep('CHF'))).toEqual({ due_minor: paid, rounding_minor: paid - due });
  });
});

type Reduction = readonly ['+' | '-', string];
type Line = PricedQuantity & { readonly code: TaxCode; readonly rate: string; readonly changes?: readonly Reduction[] };
type Change = { readonly amount: Reduction; readonly code: TaxCode; readonly rate: string };

const signed = ([sign, amount]: Reduction) => (sign === '-' ? -1 : 1) * minorOf(amount, 2);

const lineNet = (line: Line) => sumMinor([lineAmount(line, 2), ...(line.changes ?? []).map(signed)]);

const taxable = (code: TaxCode, percent: string, net_minor: number): TaxableAmount => ({
  tax: { code, percent },
  net_minor,
});

const worked = (lines: readonly Line[], changes: readonly Change[] = []) =>
  taxByCategory([
    ...lines.map((line) => taxable(line.code, line.rate, lineNet(line))),
    ...changes.map((change) => taxable(change.code, change.rate, signed(change.amount))),
  ]);

const threeLines: readonly Line[] = [
  { quantity: '1000', price: '1.00', code: 'S', rate: '25' },
  { quantity: '100', price: '5.00', code: 'S', rate: '25' },
  { quantity: '500', price: '5.00', code: 'S', rate: '12' },
];

describe('official example invoices, worked again', () => {
  // ConnectingEurope/eInvoicing-EN16931, ubl/examples/ubl-tc434-example4.xml
  it('two rates', () => {
    const { categories, ...sums } = worked(threeLines);
    expect(categories.map(({ net_minor, tax_minor }) => [net_minor, tax_minor])).toEqual([
      [1500_00, 375_00],
      [2500_00, 300_00],
    ]);
    expect(sums).toEqual({ net_minor: 4000_00, tax_minor: 675_00, gross_minor: 4675_00 });
  });

  // ConnectingEurope/eInvoicing-EN16931, ubl/examples/ubl-tc434-example5.xml
  it('allowance, charge and prepayment', () => {
    const lines = [
      {
        ...threeLines[0],
        changes: [
          ['-', '100'],
          ['+', '100'],
        ],
      } as Line,
      ...threeLines.slice(1),
    ];
    expect(percentOf(1500_00, '10')).toBe(150_00);
    const result = worked(lines, [
      { amount: ['-', '150'], code: 'S', rate: '25' },
      { amount: ['+', '150'], code: 'S', rate: '25' },
    ]);
    expect(result).toMatchObject({ tax_minor: 675_00, gross_minor: 4675_00 });
    expect(result.gross_minor - 2337_50).toBe(2337_50);
  });

  // OpenPEPPOL/peppol-bis-invoice-3, rules/examples/Allowance-example.xml
  it('line allowances, a price discount, a base quantity and an exempt line', () => {
    const changes: Reduction[] = [
      ['+', '1'],
      ['-', '101'],
    ];
    const lines: Line[] = [
      { quantity: '10', price: '410', code: 'S', rate: '25.0', changes },
      { quantity: '10', price: '200', baseQuantity: '2', code: 'E', rate: '0.0' },
      { quantity: '10', price: '100', code: 'S', rate: '25.0', changes },
    ];
    expect(lines.map(lineNet)).toEqual([4000_00, 1000_00, 900_00]);
    const result = worked(lines, [
      { amount: ['+', '200'], code: 'S', rate: '25' },
      { amount: ['-', '200'], code: 'S', rate: '25' },
    ]);
    expect(result.categories.map(({ tax, net_minor, tax_minor }) => [tax.code, net_minor, tax_minor])).toEqual([
      ['S', 4900_00, 1225_00],
      ['E', 1000_00, 0],
    ]);
    expect(result).toMatchObject({ net_minor: 5900_00, gross_minor: 7125_00 });
    expect(result.gross_minor - 1000_00).toBe(6125_00);
  });

  // ConnectingEurope/eInvoicing-EN16931, test/testfiles/BIS_Billing_30-Tjanster_Kopiering.xml
  it('half a cent of tax, and cash rounding to whole kronor', () => {
    const lines: Line[] = [
      { quantity: '1', price: '2770', code: 'S', rate: '25' },
      { quantity: '1488', price: '1.507', code: 'S', rate: '25' },
    ];
    expect(lines.map(lineNet)).toEqual([2770_00, 2242_42]);
    const result = worked(lines);
    expect(result).toMatchObject({ net_minor: 5012_42, tax_minor: 1253_11, gross_minor: 6265_53 });
    expect(cashRounding(result.gross_minor, cashStep('SEK'))).toEqual({ due_minor: 6266_00, rounding_minor: 47 });
  });

  // ConnectingEurope/eInvoicing-EN16931, test/testfiles/BIS_Billing_30-Kreditering_(urspr_faktura).xml, and its credit note
  // BIS_Billing_30-Kreditering_med_kreditnota.xml with the same figures
  it('percentages, a negative quantity, prepayment and rounding; and all of it negated', () => {
    const lines: Line[] = [
      {
        quantity: '2000',
        price: '10',
        baseQuantity: '2',
        code: 'S',
        rate: '25',
        changes: [
          ['-', '300'],
          ['+', '500'],
        ],
      },
      { quantity: '-800', price: '4', baseQuantity: '5', code: 'S', rate: '25' },
    ];
    expect([percentOf(10_000_00, '3'), percentOf(10_000_00, '5')]).toEqual([300_00, 500_00]);
    expect(lines.map(lineNet)).toEqual([10_200_00, -640_00]);
    expect([percentOf(9560_00, '20'), percentOf(10_200_00, '10')]).toEqual([1912_00, 1020_00]);
    const result = worked(lines, [
      { amount: ['-', '1912'], code: 'S', rate: '25' },
      { amount: ['+', '1020'], code: 'S', rate: '25' },
    ]);
    expect(result).toMatchObject({ net_minor: 8668_00, tax_minor: 2167_00, gross_minor: 10_835_00 });
    expect(cashRounding(result.gross_minor - 834_90, cashStep('SEK'))).toEqual({
      due_minor: 10_000_00,
      rounding_minor: -10,
    });
    const negated = taxByCategory([taxable('S', '25', -8668_00)]);
    expect(negated).toMatchObject({ tax_minor: -2167_00, gross_minor: -10_835_00 });
    expect(cashRounding(negated.gross_minor + 834_90, cashStep('SEK'))).toEqual({
      due_minor: -10_000_00,
      rounding_minor: 10,
    });
  });
});

describe('tax on the sum, never a sum of taxes', () => {
  // ConnectingEurope/eInvoicing-EN16931, ubl/examples/ubl-tc434-example8.xml: taxes line by line would come to 190.88.
  it('owes 190.87 on ten lines of a power bill', () => {
    const prices: [string, string, string][] = [
      ['16000', '0.00880', '1'],
      ['16000', '0.00101', '1'],
      ['132', '15.24', '12'],
      ['58', '1.53', '1'],
      ['1', '441.00', '12'],
      ['1', '678.00', '12'],
      ['1', '83.34', '1'],
      ['1', '190.31', '1'],
      ['1', '64.21', '1'],
      ['1', '64.46', '1'],
    ];
    const lines = prices.map(([quantity, price, baseQuantity]): Line => ({
      quantity,
      price,
      baseQuantity,
      code: 'S',
      rate: '21',
    }));
    expect(worked(lines)).toMatchObject({ net_minor: 908_91, tax_minor: 190_87, gross_minor: 1099_78 });
    expect(sumMinor(lines.map((line) => worked([line]).tax_minor))).toBe(190_88);
  });

  // ConnectingEurope/eInvoicing-EN16931, test/testfiles/BIS_Billing_30-Resor_Taxi.xml: line by line 42.43.
  it('owes 42.44 on three rides, paid in whole kronor', () => {
    const rides: [string, string, Reduction[]][] = [
      ['4.2', '23.14', [['+', '33']]],
      ['4.4', '25.09', [['+', '33']]],
      [
        '29.5',
        '13.52',
        [
          ['+', '35'],
          ['-', '0.13'],
        ],
      ],
    ];
    const lines = rides.map(([quantity, price, changes]): Line => ({ quantity, price, changes, code: 'S', rate: '6' }));
    expect(lines.map(lineNet)).toEqual([130_19, 143_40, 433_71]);
    const { gross_minor, tax_minor } = worked(lines);
    expect([tax_minor, sumMinor(lines.map((line) => worked([line]).tax_minor))]).toEqual([42_44, 42_43]);
    expect(cashRounding(gross_minor, cashStep('SEK'))).toEqual({ due_minor: 750_00, rounding_minor: 26 });
  });
});

describe('three-point figures', () => {
  const parts = 20_000;
  const figures = Array.from({ length: parts }, (_, part) => (part + 0.5) / parts).map(
    inverseDistribution({ low: 4, likely: 8, high: 13 }, 'pert'),
  );
  const mean = figures.reduce((sum, figure) => sum + figure, 0) / parts;

  // 4, 8, 13: the three-point estimate of a textbook network. Mean (4 + 4·8 + 13) ÷ 6; standard deviation and P80 are those of the beta
  // distribution with λ = 4 (own arithmetic), not the textbook's (13 − 4) ÷ 6.
  it('4, 8, 13 by PERT have the mean 8.1667, the standard deviation 1.6962 and P80 9.7139', () => {
    expect(Math.abs(mean - 8.1667)).toBeLessThan(1e-4);
    const variance = figures.reduce((sum, figure) => sum + (figure - mean) ** 2, 0) / parts;
    expect(Math.abs(Math.sqrt(variance) - 1.6962)).toBeLessThan(1e-4);
    expect(Math.abs(inverseDistribution({ low: 4, likely: 8, high: 13 }, 'pert')(0.8) - 9.7139)).toBeLessThan(1e-4);
  });

  // Closed form of the triangular distribution (own arithmetic).
  it.each([
    [0.1, 11.4142],
    [0.5, 13.6754],
    [0.8, 16],
    [0.9, 17.1716],
  ])('of 10, 12, 20 triangular, %d stay below %d', (share, expected) => {
    expect(
      Math.abs(inverseDistribution({ low: 10, likely: 12, high: 20 }, 'triangular')(share) - expected),
    ).toBeLessThan(1e-4);
  });
});

describe('work paid by a measuring rule', () => {
  const foot_mm = 304.8;
  const paidBy = (rule: MeasuringRule, measure: Partial<WorkMeasure>) => {
    const nothing = { count: 1, length_mm: null, girth_mm: null, area_mm2: null, sides: 1, worth: 1 } as const;
    return paidFor({ rule, measures: [{ ...nothing, ...measure }], typed: {} });
  };

  // A Key to Civil Architecture, 1774: four lengths of 12 ft × 3 in girth at 4 d a square foot.
  it('comes to 48 pence for four lengths of 12 ft at 3 in girth', () => {
    const paid = paidBy('plain-area', { count: 4, length_mm: 12 * foot_mm, girth_mm: foot_mm / 4 });
    expect(paid && lineAmount({ quantity: paidText(paid, 'ft²'), price: '4' }, 0)).toBe(48);
  });

  // White: 60 yd worth three times plain are paid as 180 yd; at 0.20 a yard that is 36.00.
  it('comes to three times the rate for special work worth three times the plain', () => {
    const paid = paidBy('weighted', { area_mm2: 60 * 9 * foot_mm ** 2, worth: 3 });
    const yards = Number(paid && paidText(paid, 'ft²')) / 9;
    expect(lineAmount({ quantity: String(yards), price: '0.20' }, 2)).toBe(36_00);
  });
});
