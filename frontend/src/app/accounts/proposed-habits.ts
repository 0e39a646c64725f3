import type { NewWorkshop } from '#shared/accounts/workshop-schema';

type Habits = Omit<NewWorkshop, 'name'>;

/** Currencies of countries outside the euro that a workshop is likely to stand in. */
const currencies: Readonly<Record<string, string>> = {
  AU: 'AUD',
  BR: 'BRL',
  CA: 'CAD',
  CH: 'CHF',
  CZ: 'CZK',
  DK: 'DKK',
  GB: 'GBP',
  HU: 'HUF',
  JP: 'JPY',
  MX: 'MXN',
  NO: 'NOK',
  NZ: 'NZD',
  PL: 'PLN',
  RO: 'RON',
  SE: 'SEK',
  TR: 'TRY',
  US: 'USD',
  ZA: 'ZAR',
};

/** What a new workshop most likely wants, from the browser's own language and time zone. */
export function proposedHabits(language: string): Habits {
  const locale = new Intl.Locale(language).maximize();
  const country = locale.region ?? 'GB';
  const isAmerican = country === 'US' || country === 'CA';
  return {
    country,
    locale: `${locale.language}-${country}`,
    currency: currencies[country] ?? 'EUR',
    lengthUnit: country === 'US' ? 'in' : 'mm',
    timeZone: new Intl.DateTimeFormat().resolvedOptions().timeZone,
    paperSize: isAmerican ? 'Letter' : 'A4',
  };
}
