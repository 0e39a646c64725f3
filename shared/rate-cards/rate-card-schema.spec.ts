import { complaintsOf } from '#shared/problems/complaints-of';
import { rateCardSchema } from '#shared/rate-cards/rate-card-schema';
import { startCard } from '#shared/rate-cards/start-card';

type Loose = Record<string, unknown>;

function withValue(path: readonly (string | number)[], value: unknown): unknown {
  const card = JSON.parse(JSON.stringify(startCard)) as Loose;
  let at = card;
  for (const key of path.slice(0, -1)) at = at[key] as Loose;
  at[String(path[path.length - 1])] = value;
  return card;
}

const complaints = (card: unknown) => {
  const parsed = rateCardSchema.safeParse(card);
  return parsed.success ? [] : complaintsOf(parsed.error).map((one) => [one.path.join('.'), one.code]);
};

describe('the schema of a rate card', () => {
  it('takes the card we start from as it is', () => {
    expect(rateCardSchema.parse(JSON.parse(JSON.stringify(startCard)))).toEqual(startCard);
  });

  it.each([
    ['a grade of a stage of carving', ['carving', 'stages', 1, 'gradeId'], 'card-grade-unknown'],
    ['a grade of a carving item', ['carving', 'items', 0, 'gradeId'], 'card-grade-unknown'],
    ['a grade of recutting', ['carving', 'recutting', 'gradeId'], 'card-grade-unknown'],
    ['a grade of a step', ['buildUps', 'buildUps', 0, 'steps', 0, 'gradeId'], 'card-grade-unknown'],
    ['a grade that packs', ['money', 'extras', 'packing', 'gradeId'], 'card-grade-unknown'],
    ['the leaf of sample boards', ['money', 'extras', 'sampleBoard', 'leafProductId'], 'card-leaf-unknown'],
    ['a timber that is priced', ['money', 'making', 'timbers', 0, 'timberId'], 'card-timber-unknown'],
  ] as const)('complains of %s that is not in the card', (_sentence, path, code) => {
    expect(complaints(withValue(path, 'nobody'))).toEqual([[path.join('.'), code]]);
  });

  it.each([
    ['two grades of one id', ['money', 'grades', 1, 'id'], 'master-carver', 'money.grades.1.id', 'entry-twice'],
    ['a margin of the whole price', ['money', 'profit', 'percent'], '100', 'money.profit.percent', 'entry-not-below'],
    [
      'a standard rate of nought',
      ['money', 'taxCategories', 0, 'percent'],
      '0',
      'money.taxCategories.0.percent',
      'tax-rate-misfit',
    ],
    [
      'an exempt rate above nought',
      ['money', 'taxCategories', 3, 'percent'],
      '5',
      'money.taxCategories.3.percent',
      'tax-rate-misfit',
    ],
    [
      'an exemption without its reason',
      ['money', 'taxCategories', 3, 'exemptionReason'],
      '',
      'money.taxCategories.3.exemptionReason',
      'tax-reason-misfit',
    ],
    [
      'a reason where tax is charged',
      ['money', 'taxCategories', 0, 'exemptionReason'],
      'none',
      'money.taxCategories.0.exemptionReason',
      'tax-reason-misfit',
    ],
    [
      'a category that is not on the list',
      ['money', 'defaultTaxCategoryId'],
      'gone',
      'money.defaultTaxCategoryId',
      'entry-not-offered',
    ],
    [
      'stages that leave something over',
      ['money', 'terms', 'stages', 0, 'percent'],
      '39.99',
      'money.terms.stages',
      'terms-stages-not-whole',
    ],
    [
      'more withheld than there is',
      ['money', 'terms', 'deposit_percent'],
      '96',
      'money.terms.retention_percent',
      'terms-withheld-over',
    ],
    [
      'a wage in words',
      ['money', 'grades', 0, 'costPerHour'],
      'fair',
      'money.grades.0.costPerHour',
      'entry-not-decimal',
    ],
    ['an unknown part', ['weather'], {}, 'weather', 'entry-unknown'],
  ] as const)('complains of %s', (_sentence, path, value, at, code) => {
    expect(complaints(withValue(path, value))).toContainEqual([at, code]);
    expect(complaints(withValue(path, value)).every(([where]) => where === at || code === 'entry-twice')).toBe(true);
  });
});
