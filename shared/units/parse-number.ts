import { D, type DecimalText } from '#shared/money/decimal';
import { decimalSign } from '#shared/units/decimal-sign';
import { type Parsed, unread } from '#shared/units/parsed';

/** Whether a number that could not be read is made of digits and what people group or divide them with. */
export const looksGrouped = (text: string): boolean => /^\d[\d\s.,'’٬]*\d$/.test(text);

/** Reads digits with at most one decimal sign as a decimal text, or null; nothing else is understood. */
export function plainDecimal(text: string, sign: string): DecimalText | null {
  const [whole, fraction, ...more] = text.split(sign);
  const isPlain = more.length === 0 && /^\d*$/.test(whole) && /^\d*$/.test(fraction ?? '0') && /\d/.test(text);
  return isPlain && fraction !== '' ? new D(`${whole || '0'}.${fraction ?? '0'}`).toFixed() : null;
}

/**
 * Reads a typed number with the decimal sign of a locale; thousands separators are refused, since 1.234 means two things. Gives the
 * exact decimal text and its nearest floating-point value, or a complaint.
 */
export function parseNumber(text: string, locale: string): Parsed<{ decimal: DecimalText; value: number }> {
  const sign = decimalSign(locale);
  const trimmed = text.trim();
  if (trimmed === '') return unread('entry-missing');
  const minus = /^[-−]\s*/.exec(trimmed)?.[0] ?? '';
  const digits = trimmed.slice(minus.length);
  const plain = plainDecimal(digits, sign);
  if (plain === null) return unread(looksGrouped(digits) ? 'number-grouped' : 'number-unclear', { sign });
  const decimal = new D(plain)
    .times(minus ? -1 : 1)
    .plus(0)
    .toFixed();
  return { ok: true, decimal, value: Number(decimal) };
}
