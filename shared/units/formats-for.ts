import { figureWriters } from '#shared/units/figure-writers';
import { penFor, type ReaderSettings } from '#shared/units/pen';
import { Remembered } from '#shared/units/remembered';
import type { ValueFormats } from '#shared/words/say';

const formatsOf = (settings: ReaderSettings): ValueFormats => {
  const pen = penFor(settings);
  const writers = figureWriters(pen);
  const plain = (figure: number) => pen.number(figure, 3);
  return { locale: settings.locale, write: (unit, figure) => (writers[unit] ?? plain)(figure) };
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
