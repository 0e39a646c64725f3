import type { ExtraLine } from '#shared/estimates/settings';
import type { Snapshot } from '#shared/estimates/snapshot';
import type { TaxCategory } from '#shared/rate-cards/money-card';
import { frozenExemptions } from './frozen-exemptions';

const category = (id: string, code: TaxCategory['code'], exemptionReason: string): TaxCategory => ({
  ...{ id, name: id, percent: code === 'S' ? '20' : '0', code, exemptionReason },
});
const taxCategories = [
  category('standard', 'S', ''),
  category('listed', 'E', 'Works on a listed building'),
  category('school', 'E', 'Teaching of a craft'),
  category('reverse', 'AE', 'Reverse charge'),
];

const extra = (taxCategoryId: string, alternativeId: string | null = null) =>
  ({ id: `${taxCategoryId} extra`, taxCategoryId, alternativeId }) as ExtraLine;

const snapshotOf = (taxCategoryId: string, extras: readonly ExtraLine[] = []) =>
  ({
    draft: { members: [], settings: { taxCategoryId, extras, alternatives: [{ id: 'lesson', replaces: [] }] } },
    card: { money: { taxCategories } },
  }) as unknown as Snapshot;

describe('why an issue charges no tax', () => {
  it('is nothing where all of it is taxed', () => {
    expect(frozenExemptions(snapshotOf('standard'), [])).toEqual([]);
  });

  it('is the reason of the category it stands under, not those of others with the same code', () => {
    expect(frozenExemptions(snapshotOf('listed'), [])).toEqual([{ code: 'E', reason: 'Works on a listed building' }]);
  });

  it('is one for each code: reasons under one code stand side by side', () => {
    const mixed = snapshotOf('listed', [extra('reverse'), extra('school'), extra('standard')]);
    expect(frozenExemptions(mixed, [])).toEqual([
      { code: 'E', reason: 'Works on a listed building; Teaching of a craft' },
      { code: 'AE', reason: 'Reverse charge' },
    ]);
  });

  it('is of what was chosen alone', () => {
    const choices = snapshotOf('standard', [extra('school', 'lesson')]);
    expect(frozenExemptions(choices, [])).toEqual([]);
    expect(frozenExemptions(choices, ['lesson'])).toEqual([{ code: 'E', reason: 'Teaching of a craft' }]);
  });
});
