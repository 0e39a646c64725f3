const made = new Map<string, Intl.DateTimeFormat>();

/** A format of days and times, each made once: making one takes a phone as long as writing a hundred days with it. */
export function dateFormat(locale: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = JSON.stringify([locale, options]);
  const format = made.get(key) ?? new Intl.DateTimeFormat(locale, options);
  made.set(key, format);
  return format;
}
