const signs = new Map<string, string>();

/** The sign between whole and fraction in a locale, with Latin digits: "." in British English, "," in German. */
export function decimalSign(locale: string): string {
  const known = signs.get(locale);
  if (known) return known;
  const parts = new Intl.NumberFormat(locale, { numberingSystem: 'latn' }).formatToParts(1.5);
  const sign = parts.find((part) => part.type === 'decimal')?.value ?? '.';
  signs.set(locale, sign);
  return sign;
}
