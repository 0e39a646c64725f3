import { decimalSign } from '#shared/units/decimal-sign';
import { millimetresPerInch, nanometresPer32ndInch, nanometresPerMillimetre } from '#shared/units/exact-factors';
import type { LengthUnit } from '#shared/units/length-unit';

/** A length as text without its unit, and whether it says the whole truth. */
export interface LengthFigure {
  readonly figure: string;
  readonly isExact: boolean;
}

function decimalFigure(size: number, digits: number, locale: string): string {
  const plain = Number(size.toFixed(digits)).toString();
  return plain.replace('.', decimalSign(locale));
}

function metricFigure(size_mm: number, locale: string): LengthFigure {
  const digits = size_mm < 10 ? 2 : 1;
  const isExact = Math.abs(size_mm - Number(size_mm.toFixed(digits))) * nanometresPerMillimetre < 0.5;
  return { figure: decimalFigure(size_mm, digits, locale), isExact };
}

function lowestTerms(parts: number): string {
  let numerator = parts;
  let denominator = 32;
  while (numerator % 2 === 0) {
    numerator /= 2;
    denominator /= 2;
  }
  return `${numerator}/${denominator}`;
}

/** What is smaller than this is no fraction any more: half of a 32nd would be a sixth of it or more. */
const leastFraction_nm = 3 * nanometresPer32ndInch;

/** Inches and a fraction to 1/32; smaller ones that are not exactly a fraction (a ground, a lap) in thousandths. */
function inchFigure(size_mm: number, locale: string): LengthFigure {
  const size_nm = Math.round(size_mm * nanometresPerMillimetre);
  const parts = Math.round(size_nm / nanometresPer32ndInch);
  const isExact = parts * nanometresPer32ndInch === size_nm;
  if (size_nm < leastFraction_nm && !isExact)
    return { figure: decimalFigure(size_mm / millimetresPerInch, 3, locale), isExact: false };
  const whole = Math.floor(parts / 32);
  const fraction = parts % 32 === 0 ? '' : lowestTerms(parts % 32);
  const figure = [whole > 0 || fraction === '' ? String(whole) : '', fraction].filter(Boolean).join(' ');
  return { figure, isExact };
}

/** The figure of a length in mm or in inches with a fraction, negative ones with a minus; mm in. */
export function lengthFigure(length_mm: number, unit: LengthUnit, locale: string): LengthFigure {
  const size_mm = Math.abs(length_mm);
  const { figure, isExact } = unit === 'mm' ? metricFigure(size_mm, locale) : inchFigure(size_mm, locale);
  return { figure: length_mm < 0 && figure !== '0' ? `−${figure}` : figure, isExact };
}

/**
 * A length in mm written in mm (to 0.1, below 10 mm to 0.01) or in inches with a fraction to 1/32 (below 3/32 in thousandths), ungrouped, so that `parseLength` reads
 * it back; ≈ stands before it when that is not its exact value.
 */
export function formatLength(length_mm: number, unit: LengthUnit, locale: string): string {
  const { figure, isExact } = lengthFigure(length_mm, unit, locale);
  return `${isExact ? '' : '≈ '}${figure} ${unit}`;
}
