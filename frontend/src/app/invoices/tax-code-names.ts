import { taxCodes, type TaxCode } from '#shared/money/tax-by-category';

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

/** How a line may be taxed. */
export const taxCodeChoices = taxCodes.map((value) => ({ value, label: taxCodeNames[value] }));
