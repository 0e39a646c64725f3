import { currencyDigits } from '#shared/money/currency-digits';

/** Left the list of EN 16931 code lists of 2026 (BR-CL-03, BR-CL-04) while ISO 4217 of 2024 still has it. */
const gone: readonly string[] = ['BGN'];

/**
 * Whether an invoice in a currency can go out as data: EN 16931 writes two decimals at most (BR-DEC-01 to 28), so a currency of three or
 * four would lose some.
 */
export const isExchangeCurrency = (currency: string): boolean =>
  currencyDigits(currency) <= 2 && !gone.includes(currency);
