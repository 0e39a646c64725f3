import { exemptionCodes, exemptionCodesOf } from '#shared/invoices/exemption-codes';
import { explainedCodes } from '#shared/money/tax-codes';
import { invoiceContentSchema } from '#shared/invoices/invoice-schema';

describe('reasons for charging no tax', () => {
  // 88 codes in release 1.3.16 of the rules (BR-CL-22).
  it('are the 88 of the list, each once', () => {
    expect(exemptionCodes).toHaveLength(88);
    expect(new Set(exemptionCodes).size).toBe(88);
  });

  it('are there for every category that has to have one, and for no other', () => {
    for (const code of explainedCodes) expect([code, exemptionCodesOf(code).length > 0]).toEqual([code, true]);
    expect(exemptionCodesOf('S')).toEqual([]);
    expect(exemptionCodesOf('AE')).toContain('VATEX-EU-AE');
  });

  it.each([
    ['VATEX-EU-132-1N', true],
    ['', true],
    ['VATEX-EU-132-1Z', false],
    ['cultural services', false],
  ])('are entered by their code: %s %s', (reasonCode, isRight) => {
    const { exemptions } = invoiceContentSchema.shape;
    expect(exemptions.safeParse([{ code: 'E', reasonCode, reason: '' }]).success).toBe(isRight);
  });
});
