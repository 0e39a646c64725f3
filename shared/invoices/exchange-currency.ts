import { currencyDigits } from '#shared/money/currency-digits';

/**
 * In ISO 4217 of 2024 and not in the code lists of EN 16931 (BR-CL-03, BR-CL-04): BGN left them in 2026, of Mauritania and of São Tomé they
 * still have the currencies before.
 */
const unlisted: readonly string[] = ['BGN', 'MRU', 'STN'];

/**
 * Whether an invoice in a currency can go out as data: EN 16931 writes two decimals at most (BR-DEC-01 to 28), so a currency of three or
 * four would lose some.
 */
export const isExchangeCurrency = (currency: string): boolean =>
  currencyDigits(currency) <= 2 && !unlisted.includes(currency);
