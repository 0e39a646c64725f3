import { formatDay } from '#shared/calendar/format-day';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { formatsFor } from '#shared/units/formats-for';
import type { WorkshopSettingsRow } from '../accounts';
import { words } from '../platform/http/words';

interface Sums {
  readonly grossMinor: MinorUnits;
  readonly taxMinor: MinorUnits;
}

/** Figures in letters, as the workshop writes them. */
export interface LetterFigures {
  readonly money: (amount_minor: MinorUnits, currency: string) => string;
  /** What something comes to, said to be with tax where there is some. */
  readonly total: (sums: Sums, currency: string) => string;
  readonly day: (day: string) => string;
}

export function letterFigures({ locale, lengthUnit }: WorkshopSettingsRow): LetterFigures {
  const money = (amount_minor: MinorUnits, currency: string) =>
    formatsFor({ locale, currency, lengthUnit, digits: currencyDigits(currency) }).write('minor', amount_minor);
  return {
    money,
    total: ({ grossMinor, taxMinor }, currency) =>
      words('letter-total', { total: money(grossMinor, currency), taxed: taxMinor === 0 ? 'no' : 'yes' }),
    day: (day) => formatDay(day, locale),
  };
}
