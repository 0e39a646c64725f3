import { decimalSign } from '#shared/units/decimal-sign';

interface Groups {
  /** What stands between groups: a comma, a full stop, an apostrophe, or any space. */
  readonly sign: RegExp;
  readonly whole: RegExp;
}

const known = new Map<string, Groups>();

const escaped = (sign: string): string => sign.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** A group of three last; before it groups of three, or of two where a locale counts in lakhs. */
function groupsOf(locale: string): Groups {
  const made = known.get(locale);
  if (made) return made;
  const parts = new Intl.NumberFormat(locale, { numberingSystem: 'latn' }).formatToParts(1234567);
  const written = parts.find((part) => part.type === 'group')?.value ?? '';
  const sign = /^\s$/.test(written) ? '\\s' : /^['’]$/.test(written) ? "['’]" : escaped(written);
  const inner = parts.filter((part) => part.type === 'integer').at(-2)?.value.length ?? 3;
  const whole = `(?<![\\d.,])\\d{1,${inner}}(?:${sign}\\d{${inner}})*${sign}\\d{3}(?!\\d|${sign}\\d)`;
  const groups = { sign: new RegExp(sign, 'g'), whole: new RegExp(whole, 'g') };
  known.set(locale, groups);
  return groups;
}

/**
 * A text with the digits of its figures ungrouped, as somebody of that locale would type them: "12,345.6 cm²" is "12345.6 cm²" in British
 * English. Digits that are not grouped as the locale has them stay as they are.
 */
export function ungrouped(text: string, locale: string): string {
  const { sign, whole } = groupsOf(locale);
  const decimal = decimalSign(locale);
  return text.replace(whole, (figure, at: number) => (text[at - 1] === decimal ? figure : figure.replace(sign, '')));
}
