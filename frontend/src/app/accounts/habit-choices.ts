import { currencyCodes } from '#shared/money/currency-digits';
import { inOrder, type Choice } from './choice';

/** Locales that figures and days can be written in; any other one a workshop already has is offered besides. */
const locales = [
  'bg-BG',
  'cs-CZ',
  'da-DK',
  'de-AT',
  'de-CH',
  'de-DE',
  'el-GR',
  'en-AU',
  'en-CA',
  'en-GB',
  'en-IE',
  'en-NZ',
  'en-US',
  'en-ZA',
  'es-ES',
  'es-MX',
  'et-EE',
  'fi-FI',
  'fr-BE',
  'fr-CA',
  'fr-CH',
  'fr-FR',
  'hr-HR',
  'hu-HU',
  'it-CH',
  'it-IT',
  'ja-JP',
  'ko-KR',
  'lt-LT',
  'lv-LV',
  'nb-NO',
  'nl-BE',
  'nl-NL',
  'pl-PL',
  'pt-BR',
  'pt-PT',
  'ro-RO',
  'sk-SK',
  'sl-SI',
  'sv-SE',
  'tr-TR',
  'zh-CN',
];

const letters = [...'ABCDEFGHIJKLMNOPQRSTUVWXYZ'];

/** Codes of CLDR that are no country: unions, currency areas and regions for tests. */
const noCountries = new Set(['EU', 'EZ', 'UN', 'QO', 'XA', 'XB', 'ZZ']);

const names = (type: 'currency' | 'region' | 'language') =>
  new Intl.DisplayNames(document.documentElement.lang || 'en', { type, fallback: 'none' });

const isCurrent = (code: string): boolean => !noCountries.has(code) && new Intl.Locale(`und-${code}`).region === code;

/** The countries the browser knows by name, by ISO 3166-1 code. */
export function countryChoices(): readonly Choice[] {
  const nameOf = names('region');
  const codes = letters.flatMap((first) => letters.map((second) => first + second)).filter(isCurrent);
  return inOrder(codes.flatMap((value) => (nameOf.of(value) ? [{ value, label: nameOf.of(value) ?? value }] : [])));
}

/** The currencies a workshop may keep its books in. */
function currencyChoices(): readonly Choice[] {
  const nameOf = names('currency');
  return currencyCodes.map((value) => ({ value, label: `${value}, ${nameOf.of(value) ?? value}` }));
}

/** Locales with a figure as they write it, since that is what differs. */
function localeChoices(present: string): readonly Choice[] {
  const nameOf = names('language');
  const offered = locales.includes(present) || present === '' ? locales : [...locales, present];
  const example = (locale: string) =>
    new Intl.NumberFormat(locale, { minimumFractionDigits: 2, numberingSystem: 'latn' }).format(12_345.5);
  return inOrder(offered.map((value) => ({ value, label: `${nameOf.of(value) ?? value}: ${example(value)}` })));
}

/** Browsers leave UTC out of their list, and machines are set to it all the same. */
const timeZoneChoices = (): readonly Choice[] =>
  [...new Set(['UTC', ...Intl.supportedValuesOf('timeZone')])].map((value) => ({
    value,
    label: value.replaceAll('_', ' '),
  }));

/** What a workshop may choose from; the locale it has is offered even where it is a rare one. */
export const habitChoices = (presentLocale: string) => ({
  countries: countryChoices(),
  currencies: currencyChoices(),
  locales: localeChoices(presentLocale),
  timeZones: timeZoneChoices(),
});
