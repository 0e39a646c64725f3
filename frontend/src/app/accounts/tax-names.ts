import type { TaxCategory } from '#shared/accounts/workshop-options';

/** How the tax categories of UNCL 5305 read to somebody who has to choose one. */
export const taxNames: Readonly<Record<TaxCategory, string>> = {
  S: $localize`Standard or reduced rate`,
  Z: $localize`Zero rate`,
  E: $localize`Exempt`,
  AE: $localize`Reverse charge`,
  K: $localize`Delivery within the Union, exempt`,
  G: $localize`Export, free of tax`,
  O: $localize`Outside the scope of tax`,
  L: $localize`Canary Islands (IGIC)`,
  M: $localize`Ceuta and Melilla (IPSI)`,
  B: $localize`Split payment (Italy)`,
};
