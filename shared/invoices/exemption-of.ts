import type { Exemption } from '#shared/invoices/invoice';
import type { TaxCode } from '#shared/money/tax-by-category';

/** Categories that have to say why nothing is charged (EN 16931, BR-E-10, BR-AE-10, BR-IC-10, BR-G-10, BR-O-10). */
export const explainedCodes: readonly TaxCode[] = ['E', 'AE', 'K', 'G', 'O'];

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
