import type { Formats } from '../core/formats/formats';

/** How long the work takes from its first day, in words: “12 working days” and “2.2 weeks”. */
export interface ElapsedWords {
  readonly days: string;
  readonly weeks: string;
}

/** Says a time of so many working days and weeks, one of them as one. */
export function elapsedWords(
  formats: Formats,
  { workingDays, weeks }: { readonly workingDays: number; readonly weeks: number },
): ElapsedWords {
  const [days, long] = [formats.number(workingDays, 0), formats.number(weeks, 1)];
  const one = formats.number(1, 0);
  return {
    days: days === one ? $localize`${days}:days: working day` : $localize`${days}:days: working days`,
    weeks: long === one ? $localize`${long}:weeks: week` : $localize`${long}:weeks: weeks`,
  };
}
