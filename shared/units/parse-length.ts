import { D } from '#shared/money/decimal';
import type { LengthUnit } from '#shared/units/length-unit';
import { looksGrouped, plainDecimal } from '#shared/units/parse-number';
import { type Parsed, unread, type Unread } from '#shared/units/parsed';

/** Whole nanometres are what is kept, millimetres are what is worked with. */
export interface ParsedLength {
  readonly value_nm: number;
  readonly mm: number;
}

/** The unit a bare figure is meant in, and the decimal sign of the reader's locale (`decimalSign`). */
export interface LengthReading {
  readonly unit: LengthUnit;
  readonly decimalSign: string;
}

type WrittenUnit = 'mm' | 'cm' | 'm' | 'in' | 'ft';

const nanometresPer: Readonly<Record<WrittenUnit, number>> = {
  mm: 1_000_000,
  cm: 10_000_000,
  m: 1_000_000_000,
  in: 25_400_000,
  ft: 304_800_000,
};

const unitWords: readonly (readonly [RegExp, string])[] = [
  [/''|["″”]|\b(?:inches|inch|ins?)\b\.?/g, ' in '],
  [/['′’]|\b(?:feet|foot|ft)\b\.?/g, ' ft '],
];

/** One spelling for everything: ⅞ as 7/8 apart from its whole, marks and names of inch and foot as `in` and `ft`. */
function spelt(text: string): string {
  const withFractions = text
    .toLowerCase()
    .replace(/[¼-¾⅐-⅞]/g, (sign) => ` ${sign.normalize('NFKD').replace('⁄', '/')}`);
  const apart = withFractions
    .replace(/⁄/g, '/')
    .replace(/(\d)(?=[a-z])/g, '$1 ')
    .replace(/\s*\/\s*/g, '/');
  return unitWords
    .reduce((before, [word, plain]) => before.replace(word, plain), apart)
    .replace(/\s+/g, ' ')
    .trim();
}

/** A figure with a fraction (33 7/8, 33-7/8, 7/8) or a plain decimal; null when it is neither. */
function figureOf(text: string, sign: string): { figure: D; isFraction: boolean } | null {
  const fraction = /^(?:(\d+)[ -])?(\d+)\/(\d+)$/.exec(text);
  if (fraction && Number(fraction[3]) > 0) {
    return { figure: new D(fraction[2]).div(fraction[3]).plus(fraction[1] ?? 0), isFraction: true };
  }
  const plain = plainDecimal(text, sign);
  return plain === null ? null : { figure: new D(plain), isFraction: false };
}

function nanometres(text: string, unit: WrittenUnit, sign: string): D | Unread {
  const read = figureOf(text, sign);
  if (!read) return looksGrouped(text) ? unread('number-grouped', { sign }) : unclear(unit, sign);
  if (read.isFraction && unit !== 'in' && unit !== 'ft') return unread('length-fraction');
  return read.figure.times(nanometresPer[unit]);
}

const unclear = (unit: WrittenUnit, sign: string): Unread =>
  unread('length-unclear', { example: unit === 'in' || unit === 'ft' ? '33 7/8 in' : `860 mm, 86${sign}0 cm` });

function feetAndInches(feet: string, inches: string, sign: string): D | Unread {
  const whole_nm = nanometres(feet, 'ft', sign);
  const rest_nm = nanometres(inches, 'in', sign);
  if ('code' in whole_nm) return whole_nm;
  if ('code' in rest_nm) return rest_nm;
  return rest_nm.lessThan(nanometresPer.ft) ? whole_nm.plus(rest_nm) : unread('length-inches-over');
}

function lengthOf(text: string, reading: LengthReading): D | Unread {
  const both = /^(.+?) ft (.+?)(?: in)?$/.exec(text);
  if (both) return feetAndInches(both[1], both[2], reading.decimalSign);
  const single = /^(.*?)(?: (mm|cm|m|in|ft))?$/.exec(text);
  const unit = (single?.[2] ?? reading.unit) as WrittenUnit;
  return nanometres(single?.[1] ?? text, unit, reading.decimalSign);
}

/**
 * Reads a typed length: 860, 86 cm, 0,86 m, 33 7/8 in, 33⅞″, 2' 9 7/8", 2 ft 9 7/8 in. Only the decimal sign of the locale counts and
 * grouping is refused. Gives whole nanometres (half up) and mm, or a complaint; the inch is 25.4 mm exactly.
 */
export function parseLength(text: string, reading: LengthReading): Parsed<ParsedLength> {
  const plain = spelt(text);
  if (plain === '') return unread('entry-missing');
  if (/^[-−]/.test(plain)) return unread('length-negative');
  const length_nm = lengthOf(plain, reading);
  if ('code' in length_nm) return length_nm;
  const value_nm = length_nm.toDecimalPlaces(0).toNumber();
  return Number.isSafeInteger(value_nm) ? { ok: true, value_nm, mm: value_nm / 1e6 } : unread('length-too-large');
}
