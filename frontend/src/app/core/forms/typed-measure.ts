import { lengthFigure } from '#shared/units/format-length';
import type { LengthUnit } from '#shared/units/length-unit';
import { formatDecimal } from '#shared/units/format-decimal';
import { squareMillimetresPerSquareInch } from '#shared/units/exact-factors';
import { inMetric } from '#shared/units/metric';

/** A length as it was typed, with what it comes to. */
export interface LengthEntry {
  readonly text: string;
  readonly mm: number;
}

/** An area as it was typed, with what it comes to. */
export interface AreaEntry {
  readonly text: string;
  readonly mm2: number;
}

/** How the reader writes: the unit of bare figures and the locale of their decimal sign. */
export interface Writing {
  readonly unit: LengthUnit;
  readonly locale: string;
}

const isObject = (value: unknown): value is object => typeof value === 'object' && value !== null;

/** Whether an entry carries what was typed beside what it comes to. */
export const isTypedMeasure = (value: unknown): value is LengthEntry | AreaEntry =>
  isObject(value) && 'text' in value && ('mm' in value || 'mm2' in value);

/** A length as somebody here would type it; in inches without its unit, unless no 1/32 says the whole truth: then in mm. */
function lengthText(length_mm: number, { unit, locale }: Writing): string {
  const exact_mm = formatDecimal(String(length_mm), locale);
  if (unit === 'mm') return exact_mm;
  const { figure, isExact } = lengthFigure(length_mm, unit, locale);
  return isExact ? figure : `${exact_mm} mm`;
}

// Twelve figures are more than anybody measures, and leave out what a float adds at its end.
const clean = (size: number): number => Number(size.toPrecision(12));

/** An area as somebody here would type it: in square inches where three decimals say the whole truth, else in cm². */
function areaText(area_mm2: number, { unit, locale }: Writing): string {
  const size_in2 = clean(area_mm2 / squareMillimetresPerSquareInch);
  const isExact = unit === 'in' && Math.abs(size_in2 - Number(size_in2.toFixed(3))) < 1e-9;
  const [size, sign] = isExact ? [size_in2, 'in²'] : [clean(inMetric(area_mm2, 'mm2', 'cm2')), 'cm²'];
  return `${formatDecimal(String(size), locale)} ${sign}`;
}

/** The entry of a length or an area by the ending of its name, shown as it was typed where that is known. */
export function typedMeasure(value: number, typed: string | undefined, at: Writing & { name: string }): object {
  return at.name.endsWith('_mm2')
    ? { text: typed ?? areaText(value, at), mm2: value }
    : { text: typed ?? lengthText(value, at), mm: value };
}

/** Whether a name says that its figure is a length or an area. */
export const isMeasureName = (name: string): boolean => /_mm2?$/.test(name);

/** What is to be remembered of a text: nothing where it would be written the same anyway; a bare figure with the unit it was meant in. */
export function rememberedText(entry: LengthEntry | AreaEntry, writing: Writing): string | undefined {
  // What cannot be read is kept letter by letter, to be shown again.
  if (Number.isNaN('mm2' in entry ? entry.mm2 : entry.mm)) return entry.text;
  if ('mm2' in entry) return entry.text === areaText(entry.mm2, writing) ? undefined : entry.text;
  if (entry.text.trim() === lengthText(entry.mm, writing)) return undefined;
  return /[a-z'"′″’”]/i.test(entry.text) ? entry.text : `${entry.text.trim()} ${writing.unit}`;
}
