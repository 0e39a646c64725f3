import type { TaxCode } from '#shared/money/tax-codes';

const rated: readonly TaxCode[] = ['S', 'L', 'M', 'B'];

/** Whether a tax category (UNCL 5305 as EN 16931 restricts it) has a rate of its own; every other one charges nothing. */
export const isRated = (code: TaxCode): boolean => rated.includes(code);
