import { formatDay } from '#shared/calendar/format-day';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { formatsFor } from '#shared/units/formats-for';
import type { WorkshopSettingsRow } from '../accounts';

/** Figures in letters, as the workshop writes them. */
export interface LetterFigures {
  readonly money: (amount_minor: MinorUnits, currency: string) => string;
  readonly day: (day: string) => string;
}

export const letterFigures = ({ locale, lengthUnit }: WorkshopSettingsRow): LetterFigures => ({
  money: (amount_minor, currency) =>
    formatsFor({ locale, currency, lengthUnit, digits: currencyDigits(currency) }).write('minor', amount_minor),
  day: (day) => formatDay(day, locale),
});
