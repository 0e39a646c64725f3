import { D } from '#shared/money/decimal';
import { textOf } from '#shared/money/text-of';
import { squareMillimetresPerSquareFoot, squareMillimetresPerSquareInch } from '#shared/units/exact-factors';
import { lengthFigure } from '#shared/units/format-length';
import { inMetric } from '#shared/units/metric';
import type { Pen } from '#shared/units/pen';
import { inTemperatureUnit, temperatureUnit } from '#shared/units/temperature-unit';
import { trueMinus } from '#shared/units/true-minus';
import type { WordCode } from '#shared/words/word-code';

type Write = (figure: number) => string;

function amountFormat({ settings }: Pen, mostDigits: number): Intl.NumberFormat {
  const { locale, currency, digits, currencyDisplay } = settings;
  return new Intl.NumberFormat(locale, {
    ...{ style: 'currency', currency, currencyDisplay, numberingSystem: 'latn' },
    ...{ minimumFractionDigits: digits, maximumFractionDigits: mostDigits },
  });
}

function moneyWriter(pen: Pen): Write {
  const { digits } = pen.settings;
  const format = amountFormat(pen, digits);
  // A decimal text is formatted digit by digit; as a number, sums above 45 million million minor units could lose one.
  const exact = (amount: number) => format.format(textOf(amount, digits) as unknown as number);
  return (figure) => trueMinus(Number.isSafeInteger(figure) ? exact(figure) : format.format(figure / 10 ** digits));
}

/** What an hour costs, in minor units, with every decimal it has: rounded, hours × rate would not come to the cost beside it. */
function rateWriter(pen: Pen): Write {
  const { digits } = pen.settings;
  const format = amountFormat(pen, digits + 6);
  return (figure) => trueMinus(format.format(new D(figure).div(10 ** digits).toFixed() as unknown as number));
}

function percentWriter({ settings: { locale } }: Pen): Write {
  const format = new Intl.NumberFormat(locale, { style: 'percent', maximumFractionDigits: 2, numberingSystem: 'latn' });
  return (figure) => trueMinus(format.format(figure / 100));
}

/** Minutes as days, hours and minutes, leaving out what is nought: 45 min, 2 d 4 h. */
function durationWriter({ worded }: Pen): Write {
  return (figure) => {
    const total = Math.round(Math.abs(figure));
    const parts = [
      [Math.floor(total / 1440), 'unit-days'],
      [Math.floor((total % 1440) / 60), 'unit-hours'],
      [total % 60, 'unit-minutes'],
    ] as const;
    const told = parts.filter(([count]) => count > 0).map(([count, code]) => worded(code, count, 0));
    return `${figure < 0 && told.length > 0 ? '−' : ''}${told.join(' ') || worded('unit-minutes', 0, 0)}`;
  };
}

/** An area with as many decimals as its unit takes everywhere, so that figures under each other align; what rounds to nothing is a plain nought. */
const areaIn =
  ({ worded }: Pen, code: WordCode) =>
  (size: number, digits: number): string =>
    worded(code, size, Number(size.toFixed(digits)) === 0 ? 0 : { exactly: digits });

/** Whether a size is still below a limit once it is written, since 99.996 with two decimals is 100.00, and 100 takes none. */
const staysBelow = (limit: number, size: number, digits: number): boolean =>
  new D(size).abs().toDecimalPlaces(digits).lt(limit);

const metricArea = (pen: Pen): Write => {
  const [small, large] = [areaIn(pen, 'unit-square-centimetres'), areaIn(pen, 'unit-square-metres')];
  return (area_mm2) => {
    const area_cm2 = inMetric(area_mm2, 'mm2', 'cm2');
    if (staysBelow(100, area_cm2, 2)) return small(area_cm2, 2);
    return staysBelow(10_000, area_cm2, 0) ? small(area_cm2, 0) : large(inMetric(area_mm2, 'mm2', 'm2'), 2);
  };
};

const imperialArea = (pen: Pen): Write => {
  const [small, large] = [areaIn(pen, 'unit-square-inches'), areaIn(pen, 'unit-square-feet')];
  const inchesPerFoot = squareMillimetresPerSquareFoot / squareMillimetresPerSquareInch;
  return (area_mm2) => {
    const area_in2 = area_mm2 / squareMillimetresPerSquareInch;
    return staysBelow(inchesPerFoot, area_in2, 1)
      ? small(area_in2, 1)
      : large(area_mm2 / squareMillimetresPerSquareFoot, 2);
  };
};

function lengthWriter({ settings: { lengthUnit, locale }, withUnit }: Pen): Write {
  return (length_mm) => {
    const { figure, isExact } = lengthFigure(length_mm, lengthUnit, locale);
    if (lengthUnit === 'mm') return withUnit('unit-mm', figure);
    // In mm a worked figure is rounded as any other is; a fraction of an inch would look exact.
    return `${isExact ? '' : '≈ '}${withUnit('unit-inches', figure)}`;
  };
}

const massWriter = ({ worded }: Pen): Write => {
  return (mass) =>
    Math.abs(mass) < 1000 ? worded('unit-grams', mass) : worded('unit-kilograms', inMetric(mass, 'g', 'kg'), 2);
};

const volumeWriter = ({ worded }: Pen): Write => {
  return (volume) =>
    Math.abs(volume) < 1
      ? worded('unit-millilitres', inMetric(volume, 'l', 'ml'), 1)
      : worded('unit-litres', volume, 2);
};

function temperatureWriter({ settings: { locale, lengthUnit }, worded }: Pen): Write {
  return (temperature_celsius) => {
    const unit = temperatureUnit(locale, lengthUnit);
    return worded(`unit-${unit}`, inTemperatureUnit(temperature_celsius, unit), 1);
  };
}

/** How each unit a figure can carry is written with a reader's pen, by the ending of the value's name. */
export function figureWriters(pen: Pen): Readonly<Record<string, Write>> {
  const { worded, number, withUnit, settings } = pen;
  return {
    mm: lengthWriter(pen),
    mm2: settings.lengthUnit === 'in' ? imperialArea(pen) : metricArea(pen),
    minor: moneyWriter(pen),
    rate_minor: rateWriter(pen),
    percent: percentWriter(pen),
    hours: (figure) => worded('unit-hours', figure, 2),
    minutes: durationWriter(pen),
    days: (figure) => worded('unit-whole-days', figure, 1),
    celsius: temperatureWriter(pen),
    µm: (figure) => worded('unit-micrometres', figure, 3),
    grams: massWriter(pen),
    litres: volumeWriter(pen),
    leaves: (figure) => worded('unit-leaves', figure, 1),
    booklets: (figure) => worded('unit-booklets', figure, 1),
    packs: (figure) => worded('unit-packs', figure, 1),
    pieces: (figure) => worded('unit-pieces', figure, 1),
    factor: (figure) => withUnit('unit-factor', number(figure, 4, 2)),
    divisor: (figure) => withUnit('unit-divisor', number(figure, 4, 2)),
  };
}
