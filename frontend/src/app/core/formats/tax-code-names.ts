import { taxCodes, type TaxCode } from '#shared/money/tax-codes';

/** How the tax categories read to somebody who has to choose one. */
export const taxCodeNames: Readonly<Record<TaxCode, string>> = {
  S: $localize`Standard or reduced rate`,
  Z: $localize`Zero rated`,
  E: $localize`Exempt`,
  AE: $localize`Reverse charge`,
  K: $localize`Supply within the Union`,
  G: $localize`Export`,
  O: $localize`Outside the scope`,
  L: $localize`Canary Islands (IGIC)`,
  M: $localize`Ceuta and Melilla (IPSI)`,
  B: $localize`Split payment (Italy)`,
};

/** What may be chosen where tax is. */
export const taxCodeChoices = taxCodes.map((value) => ({ value, label: taxCodeNames[value] }));
