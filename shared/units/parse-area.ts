import { D } from '#shared/money/decimal';
import { decimalSign } from '#shared/units/decimal-sign';
import type { LengthUnit } from '#shared/units/length-unit';
import { ungrouped } from '#shared/units/ungrouped';
import { looksGrouped, plainDecimal } from '#shared/units/parse-number';
import { type Parsed, unread } from '#shared/units/parsed';

/** The unit a bare figure is meant in (cm² where one measures in mm, in² otherwise), and the reader's locale. */
export interface AreaReading {
  readonly unit: LengthUnit;
  readonly locale: string;
}

const squareMillimetresPer: Readonly<Record<string, string>> = {
  mm: '1',
  cm: '100',
  dm: '10000',
  m: '1000000',
  in: '645.16',
  ft: '92903.04',
};

const written = /^(.*?)\s*(?:(?:sq\.?\s*)?(mm|cm|dm|m|in|ft)\s*(?:²|\^?2)?)?$/i;

/**
 * Reads a typed area: 1200 cm², 0.12 m2, 186 sq in, 1.3 ft². Only the decimal sign of the locale counts; grouped digits are taken where
 * their unit stands behind them, as a page writes them, and refused bare. Gives mm², or a complaint; the inch is 25.4 mm exactly.
 */
export function parseArea(text: string, { unit, locale }: AreaReading): Parsed<{ mm2: number }> {
  const plain = text.trim();
  const sign = decimalSign(locale);
  if (plain === '') return unread('entry-missing');
  if (/^[-−]/.test(plain)) return unread('area-negative');
  const [, figure = plain, named] = written.exec(plain) ?? [];
  const decimal = plainDecimal(named ? ungrouped(figure.trim(), locale) : figure.trim(), sign);
  if (decimal === null)
    return looksGrouped(figure)
      ? unread('number-grouped', { sign })
      : unread('area-unclear', { example: unit === 'in' ? '186 in²' : '1200 cm²' });
  const factor = squareMillimetresPer[named?.toLowerCase() ?? (unit === 'in' ? 'in' : 'cm')];
  return { ok: true, mm2: new D(decimal).times(factor).toNumber() };
}
