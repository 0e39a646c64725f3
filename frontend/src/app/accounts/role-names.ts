import type { Role } from '#shared/actor/role';

/** What a role is called, and what it may do here. */
export const roleNames: Readonly<Record<Role, { readonly name: string; readonly may: string }>> = {
  owner: {
    name: $localize`Owner`,
    may: $localize`sets rates and prices, approves and issues, looks after people and settings`,
  },
  estimator: { name: $localize`Estimator`, may: $localize`measures, works out and issues estimates` },
  bench: { name: $localize`Bench`, may: $localize`sees the day’s work, logs hours, leaf and readings; never costs` },
  office: { name: $localize`Office`, may: $localize`invoices, payments, purchase lists; prices without their costs` },
};
