import type { ContractPart } from '#shared/agreements/contract';
import { taxByCategory } from '#shared/money/tax-by-category';

/**
 * Whether parts make a contract: nothing of it below nothing, under no tax. A variation may take away what was agreed and no more, and only
 * under the taxes it was agreed under, since what is given back was charged under them. Own rule; common practice, no source.
 */
export const holdsTogether = (parts: readonly Pick<ContractPart, 'taxes'>[]): boolean =>
  taxByCategory(parts.flatMap(({ taxes }) => taxes)).categories.every(({ net_minor }) => net_minor >= 0);
