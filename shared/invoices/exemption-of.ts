import type { Exemption } from '#shared/invoices/invoice';
import { explainedCodes, type TaxCode } from '#shared/money/tax-codes';

/** Codes of the VATEX list (EN 16931 code lists) for the categories that have one reason only; an exemption has many. */
const ownCodes: Partial<Readonly<Record<TaxCode, string>>> = {
  AE: 'VATEX-EU-AE',
  K: 'VATEX-EU-IC',
  G: 'VATEX-EU-G',
  O: 'VATEX-EU-O',
};

/** Why a category charges no tax: what was entered, else the one reason its category has; undefined where neither is there. */
export function exemptionOf(code: TaxCode, entered: readonly Exemption[]): Exemption | undefined {
  if (!explainedCodes.includes(code)) return undefined;
  const own = entered.find((exemption) => exemption.code === code);
  const reasonCode = own?.reasonCode || (ownCodes[code] ?? '');
  return reasonCode === '' && !own?.reason ? undefined : { code, reasonCode, reason: own?.reason ?? '' };
}
