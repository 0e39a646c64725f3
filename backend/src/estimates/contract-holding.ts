import type { TaxedNet } from '#shared/money/tax-by-category';

/**
 * Refuses where what was agreed on a job, with this beside it, would come below nothing: a variation takes away no more than there is.
 * A later feature supplies it.
 */
export type ContractHolding = (workshopId: string, jobId: string, more?: readonly TaxedNet[]) => Promise<void>;
