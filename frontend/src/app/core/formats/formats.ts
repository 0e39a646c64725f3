import { Injectable, computed, inject } from '@angular/core';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { textOf } from '#shared/money/text-of';
import { formatDecimal } from '#shared/units/format-decimal';
import { formatLength } from '#shared/units/format-length';
import { formatsFor } from '#shared/units/formats-for';
import { roughLength } from '#shared/units/rough-length';
import { celsiusOf, inTemperatureUnit, temperatureUnit } from '#shared/units/temperature-unit';
import { trueMinus } from '#shared/units/true-minus';
import { Session } from '../session/session';
import { CATALOGUE } from './catalogue';
import { dateFormat } from './date-format';
import { dayStyles, type DayStyle } from './day-styles';
import { SHOWN_CURRENCY } from './shown-currency';
import { strangerSettings } from './stranger-settings';

/** Writes figures, money, days and times as the workshop has them; everything is read from signals, so a change of setting shows at once. */
@Injectable({ providedIn: 'root' })
export class Formats {
  private readonly session = inject(Session);
  private readonly catalogue = inject(CATALOGUE);
  private readonly reader = computed(() => this.session.reader() ?? strangerSettings());

  readonly locale = computed(() => this.reader().locale);
  private readonly shown = inject(SHOWN_CURRENCY);
  /** The workshop's, or that of the page's own subject. */
  readonly currency = computed(() => this.shown() ?? this.reader().currency);
  readonly lengthUnit = computed(() => this.reader().lengthUnit);
  readonly temperatureUnit = computed(() => temperatureUnit(this.locale(), this.lengthUnit()));
  readonly temperatureSign = computed(() => (this.temperatureUnit() === 'celsius' ? '°C' : '°F'));
  readonly timeZone = computed(() => this.reader().timeZone);
  readonly currencyDigits = computed(() => currencyDigits(this.currency()));
  readonly currencySign = computed(() => signOf(this.locale(), this.currency()));

  /** What `say` and everything else writes figures with. */
  readonly values = computed(() =>
    formatsFor({
      locale: this.locale(),
      currency: this.currency(),
      digits: this.currencyDigits(),
      lengthUnit: this.lengthUnit(),
      catalogue: this.catalogue,
    }),
  );

  /** A figure with its unit: `figure('mm2', 215_400)` is 2,154 cm². Units as in `formatsFor`. */
  figure(unit: string, figure: number): string {
    return this.values().write(unit, figure);
  }

  length(length_mm: number): string {
    return this.figure('mm', length_mm);
  }

  /** A length in a list or on a drawing, where nobody reads more than the millimetre or the 32nd. */
  roughLength(length_mm: number): string {
    return this.length(roughLength(length_mm, this.lengthUnit()));
  }

  area(area_mm2: number): string {
    return this.figure('mm2', area_mm2);
  }

  money(amount_minor: MinorUnits): string {
    return this.figure('minor', amount_minor);
  }

  /** Money in the currency of a paper, which need not be the one the books are kept in today. */
  moneyIn(currency: string, amount_minor: MinorUnits): string {
    if (currency === this.currency()) return this.money(amount_minor);
    const format = new Intl.NumberFormat(this.locale(), { style: 'currency', currency, numberingSystem: 'latn' });
    return trueMinus(format.format(textOf(amount_minor, currencyDigits(currency)) as unknown as number));
  }

  /** Money without its minor units, for a place where the whole figure stands beside it or in its explanation. */
  wholeMoney(amount_minor: MinorUnits): string {
    const options = {
      style: 'currency',
      currency: this.currency(),
      maximumFractionDigits: 0,
      numberingSystem: 'latn',
    } as const;
    const format = new Intl.NumberFormat(this.locale(), options);
    // A decimal text is formatted digit by digit, where a division would make a float of it.
    return trueMinus(format.format(textOf(amount_minor, this.currencyDigits()) as unknown as number));
  }

  /** Money without its sign, for a column whose heading has it. */
  amount(amount_minor: MinorUnits): string {
    return this.amountIn(this.currency(), amount_minor);
  }

  /** The same of another currency, in its own minor units. */
  amountIn(currency: string, amount_minor: MinorUnits): string {
    const count = currencyDigits(currency);
    const digits = { minimumFractionDigits: count, maximumFractionDigits: count };
    const format = new Intl.NumberFormat(this.locale(), { numberingSystem: 'latn', ...digits });
    return trueMinus(format.format(textOf(amount_minor, count) as unknown as number));
  }

  /** A plain number with at most and at least so many decimals, grouped as the locale has it. */
  number(figure: number, most = 2, least = 0): string {
    const digits = { minimumFractionDigits: least, maximumFractionDigits: most };
    return trueMinus(new Intl.NumberFormat(this.locale(), { numberingSystem: 'latn', ...digits }).format(figure + 0));
  }

  /** A share of a hundred with its sign as the locale has it, with at most and at least so many decimals. */
  percent(figure_percent: number, most = 2, least = 0): string {
    const options = { style: 'percent', minimumFractionDigits: least, maximumFractionDigits: most } as const;
    const format = new Intl.NumberFormat(this.locale(), { numberingSystem: 'latn', ...options });
    return trueMinus(format.format(figure_percent / 100));
  }

  /** What something is more or less by: its sign directly before the size as `write` has it; nothing is written without one. */
  signed(difference: number, write: (size: number) => string): string {
    const sign = difference > 0 ? '+' : difference < 0 ? '−' : '';
    return `${sign}${write(Math.abs(difference))}`;
  }

  /** A number as somebody here would type it: ungrouped, with the locale's decimal sign. */
  typed(figure: number): string {
    return Number.isFinite(figure) ? formatDecimal(String(figure), this.locale()) : '';
  }

  /** A temperature in the degrees of somebody here, and back. */
  degrees(temperature_celsius: number): number {
    return inTemperatureUnit(temperature_celsius, this.temperatureUnit());
  }

  celsius(degrees: number): number {
    return celsiusOf(degrees, this.temperatureUnit());
  }

  /** A length in the unit it was not typed in (the workshop’s own where the text names none), for a reading marked ≈ beside it. */
  otherLength(length_mm: number, typed = ''): string {
    const isInches = /["″”'′’]|\b(in|ft)\b/i.test(typed) || (this.lengthUnit() === 'in' && !/m\s*$/i.test(typed));
    return formatLength(length_mm, isInches ? 'mm' : 'in', this.locale()).replace('≈ ', '');
  }

  /** A day (2026-06-04) in words. */
  day(day: string, style: DayStyle = 'dated'): string {
    return dateFormat(this.locale(), { ...dayStyles[style], timeZone: 'UTC' }).format(new Date(`${day}T00:00:00Z`));
  }

  /** The day of a moment, in the workshop's time zone. */
  dayOf(moment: string | Date, style: DayStyle = 'dated'): string {
    return dateFormat(this.locale(), { ...dayStyles[style], timeZone: this.timeZone() }).format(new Date(moment));
  }

  /** The time of day of a moment, in the workshop's time zone. */
  time(moment: string | Date): string {
    const options = { hour: '2-digit', minute: '2-digit', timeZone: this.timeZone() } as const;
    return dateFormat(this.locale(), options).format(new Date(moment));
  }
}

function signOf(locale: string, currency: string): string {
  const parts = new Intl.NumberFormat(locale, { style: 'currency', currency }).formatToParts(0);
  return parts.find(({ type }) => type === 'currency')?.value ?? currency;
}
