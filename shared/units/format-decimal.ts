import type { DecimalText } from '#shared/money/decimal';
import { decimalSign } from '#shared/units/decimal-sign';

/** A decimal as somebody of that locale would type it, ungrouped, so that `parseNumber` reads it back. */
export const formatDecimal = (decimal: DecimalText, locale: string): string =>
  decimal.replace('.', decimalSign(locale));
