import type { LengthUnit } from '#shared/units/length-unit';
import { trueMinus } from '#shared/units/true-minus';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';
import type { Catalogue, WordCode } from '#shared/words/word-code';

/** A reader's locale, currency (with its ISO 4217 decimals) and unit of length; the words are English unless another catalogue is given. */
export interface ReaderSettings {
  readonly locale: string;
  readonly currency: string;
  readonly digits: number;
  readonly lengthUnit: LengthUnit;
  readonly catalogue?: Catalogue;
  /** How amounts name their currency: by its sign unless it is to be its ISO 4217 code. */
  readonly currencyDisplay?: 'code';
}

/** What figures are written with. */
export interface Pen {
  readonly settings: ReaderSettings;
  /** A number with at most and at least so many decimals. */
  readonly number: (figure: number, most: number, least?: number) => string;
  /** A figure that is already text, with its unit. */
  readonly withUnit: (code: WordCode, figure: string, count?: number) => string;
  /** A number with its unit, in the plural where the unit is counted; with at most so many decimals, or exactly so many. */
  readonly worded: (code: WordCode, figure: number, decimals?: number | { readonly exactly: number }) => string;
}

/** How many decimals a figure deserves by its size. */
const decimalsFor = (figure: number): number => {
  const size = Math.abs(figure);
  if (size < 1) return 3;
  return size < 10 ? 2 : 1;
};

function numberWriter(locale: string): Pen['number'] {
  const known = new Map<string, Intl.NumberFormat>();
  return (figure, most, least = 0) => {
    const key = `${least}-${most}`;
    const decimals = { minimumFractionDigits: least, maximumFractionDigits: most };
    const format = known.get(key) ?? new Intl.NumberFormat(locale, { ...decimals, numberingSystem: 'latn' });
    known.set(key, format);
    return trueMinus(format.format(figure + 0));
  };
}

/** The pen of a reader: numbers in their locale, units in their words. */
export function penFor(settings: ReaderSettings): Pen {
  const number = numberWriter(settings.locale);
  const sayUnit = say(settings.catalogue ?? en, { locale: settings.locale, write: (_unit, figure) => String(figure) });
  const withUnit: Pen['withUnit'] = (code, figure, count = 0) => sayUnit(code, { figure, count });
  const worded: Pen['worded'] = (code, figure, decimals = decimalsFor(figure)) => {
    const [most, least] = typeof decimals === 'number' ? [decimals, 0] : [decimals.exactly, decimals.exactly];
    return withUnit(code, number(figure, most, least), Number(figure.toFixed(most)));
  };
  return { settings, number, withUnit, worded };
}
