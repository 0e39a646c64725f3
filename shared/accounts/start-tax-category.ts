import type { TaxCode } from '#shared/money/tax-codes';

/** Countries that levy neither a value added tax nor one like it (from memory; ISO 3166-1). What else they levy, the workshop enters itself. */
const withoutVat: ReadonlySet<string> = new Set(['BM', 'BN', 'HK', 'KW', 'KY', 'MO', 'QA', 'US']);

/** The tax category a workshop of a country (ISO 3166-1) begins with, as a code of UNCL 5305: its own to change. */
export const startTaxCategory = (country: string): TaxCode => (withoutVat.has(country) ? 'O' : 'S');
