import type { Period } from './invoice-calls';

const lastOf = (year: number, month: number): string => new Date(Date.UTC(year, month, 0)).toISOString().slice(0, 10);

const firstOf = (year: number, month: number): string =>
  new Date(Date.UTC(year, month - 1, 1)).toISOString().slice(0, 10);

/** The month a day lies in, so many months before it; whole months, as accountants ask for them. */
export function monthOf(day: string, back = 0): Period {
  const [year, month] = day.split('-').map(Number);
  return { from: firstOf(year, month - back), to: lastOf(year, month - back) };
}

/** The quarter a day lies in, so many quarters before it. */
export function quarterOf(day: string, back = 0): Period {
  const [year, month] = day.split('-').map(Number);
  const first = month - ((month - 1) % 3) - 3 * back;
  return { from: firstOf(year, first), to: lastOf(year, first + 2) };
}

/** The year a day lies in, so many years before it. */
export function yearOf(day: string, back = 0): Period {
  const year = Number(day.slice(0, 4)) - back;
  return { from: `${year}-01-01`, to: `${year}-12-31` };
}
