import type { Period } from './invoice-calls';
import { monthOf } from './month-of';

const isDay = (text: string | undefined): text is string => /^\d{4}-\d{2}-\d{2}$/.test(text ?? '');

/** The period of an address, or the month it is. */
export function askedPeriod(from: string | undefined, to: string | undefined, today: string): Period {
  return isDay(from) && isDay(to) ? { from, to } : monthOf(today);
}
