import { millimetresPerFoot, millimetresPerInch } from '#shared/units/exact-factors';
import { figureWriters } from '#shared/units/figure-writers';
import { type Pen, penFor, type ReaderSettings } from '#shared/units/pen';
import { Remembered } from '#shared/units/remembered';
import type { ValueFormats } from '#shared/words/say';

/** The metric measures that rates of a card go by, told in feet and inches. */
function measuresInInches(pen: Pen): NonNullable<ValueFormats['measures']> {
  const { mm2 } = figureWriters(pen);
  return {
    ofMetre: ` (${pen.withUnit('unit-feet', pen.number(1000 / millimetresPerFoot, 2))})`,
    ofSquareMetre: ` (${mm2(1e6)})`,
    ofSquareDecimetre: ` (${mm2(1e4)})`,
    ofCubicDecimetre: ` (${pen.withUnit('unit-cubic-inches', pen.number((100 / millimetresPerInch) ** 3, 0))})`,
  };
}

const formatsOf = (settings: ReaderSettings): ValueFormats => {
  const pen = penFor(settings);
  const writers = figureWriters(pen);
  const plain = (figure: number) => pen.number(figure, 3);
  const { locale, lengthUnit } = settings;
  const measures = lengthUnit === 'in' ? { measures: measuresInInches(pen) } : {};
  return { locale, write: (unit, figure) => (writers[unit] ?? plain)(figure), ...measures };
};

/** Making formats is slow and using them is quick: those of the readers of late are kept. */
const known = new Remembered<ValueFormats>(100);

/**
 * How figures are written for a reader, by the ending of a value's name: mm, mm2, minor, rate_minor, hours, minutes, days, percent, celsius, µm, grams,
 * litres, leaves, booklets, packs, pieces, factor, divisor; any other ending is a plain number. Decimals of money never come from Intl.
 */
export function formatsFor(settings: ReaderSettings): ValueFormats {
  const { locale, currency, digits, lengthUnit, catalogue, currencyDisplay = '' } = settings;
  if (catalogue) return formatsOf(settings);
  const key = [locale, currency, digits, lengthUnit, currencyDisplay].join(' ');
  return known.of(key, () => formatsOf(settings));
}
