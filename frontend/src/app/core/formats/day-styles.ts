/** How dates and times are written: in a table, in a sentence, as a heading. */
export const dayStyles = {
  short: { day: 'numeric', month: 'short' },
  dated: { day: 'numeric', month: 'short', year: 'numeric' },
  long: { weekday: 'long', day: 'numeric', month: 'long' },
  weekday: { weekday: 'short', day: 'numeric' },
  full: { weekday: 'short', day: 'numeric', month: 'short' },
  month: { month: 'short', year: 'numeric' },
} as const satisfies Record<string, Intl.DateTimeFormatOptions>;

export type DayStyle = keyof typeof dayStyles;
