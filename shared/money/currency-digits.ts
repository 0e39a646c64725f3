/**
 * Decimals of every currency of ISO 4217 (list of 2024-06-25, as the package currency-codes 2.2.0 carries it). Intl has its own, cash-like
 * decimals for 29 of them, so it is never asked.
 */
const codesByDigits: Readonly<Record<number, string>> = {
  0:
    'BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XAG XAU XBA XBB XBC XBD XDR XOF XPD XPF XPT XSU ' +
    'XTS XUA XXX',
  2:
    'AED AFN ALL AMD ANG AOA ARS AUD AWG AZN BAM BBD BDT BGN BMD BND BOB BOV BRL BSD BTN BWP BYN BZD CAD CDF CHE ' +
    'CHF CHW CNY COP COU CRC CUC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP GEL GHS GIP GMD GTQ GYD HKD ' +
    'HNL HTG HUF IDR ILS INR IRR JMD KES KGS KHR KPW KYD KZT LAK LBP LKR LRD LSL MAD MDL MGA MKD MMK MNT MOP MRU ' +
    'MUR MVR MWK MXN MXV MYR MZN NAD NGN NIO NOK NPR NZD PAB PEN PGK PHP PKR PLN QAR RON RSD RUB SAR SBD SCR SDG ' +
    'SEK SGD SHP SLE SOS SRD SSP STN SVC SYP SZL THB TJS TMT TOP TRY TTD TWD TZS UAH USD USN UYU UZS VED VES WST ' +
    'XCD YER ZAR ZMW ZWG',
  3: 'BHD IQD JOD KWD LYD OMR TND',
  4: 'CLF UYW',
};

const digitsByCode: ReadonlyMap<string, number> = new Map(
  Object.entries(codesByDigits).flatMap(([digits, codes]) =>
    codes.split(' ').map((code) => [code, Number(digits)] as const),
  ),
);

/** Codes that name a metal, a unit of account or a test, in which nobody is billed. */
const withoutTender: ReadonlySet<string> = new Set('XAG XAU XBA XBB XBC XBD XDR XPD XPT XSU XTS XUA XXX'.split(' '));

/** Every currency a workshop may keep its books in, by ISO 4217 code, in alphabetical order. */
export const currencyCodes: readonly string[] = [...digitsByCode.keys()]
  .filter((code) => !withoutTender.has(code))
  .sort();

/** How many decimals a currency has by ISO 4217; RangeError for a code it does not list. */
export function currencyDigits(currency: string): number {
  const digits = digitsByCode.get(currency);
  if (digits === undefined) throw new RangeError(`${currency} is not a currency of ISO 4217`);
  return digits;
}
