import type { Figures } from '#shared/estimates/figures';

/** Whether a price has any tax in it that a paper could say is included. */
export const isTaxed = ({ taxes }: Pick<Figures['price'], 'taxes'>): boolean =>
  taxes.some(({ tax_minor }) => tax_minor !== 0);
