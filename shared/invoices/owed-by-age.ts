import { daysBetween } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';

/** What an issued invoice leaves open, in whole minor units, and the day it fell or falls due. */
export interface OpenInvoice {
  readonly clientId: string;
  readonly dueOn: Day;
  readonly open_minor: MinorUnits;
}

/** How long something is overdue: not yet, up to 30, 60, 90 days, longer (common practice, no source). */
export const ages = ['not-due', 'to-30', 'to-60', 'to-90', 'over-90'] as const;
export type Age = (typeof ages)[number];

/** What one client owes, by age, less what lies here to their credit. */
export interface Owed {
  readonly clientId: string;
  readonly byAge_minor: Readonly<Record<Age, MinorUnits>>;
  readonly open_minor: MinorUnits;
  readonly credit_minor: MinorUnits;
}

/** How old an amount is on a day: due today is not overdue yet; RangeError for what is no day. */
export function ageOf(dueOn: Day, today: Day): Age {
  const overdue_days = daysBetween(dueOn, today);
  if (overdue_days <= 0) return 'not-due';
  if (overdue_days <= 30) return 'to-30';
  if (overdue_days <= 60) return 'to-60';
  return overdue_days <= 90 ? 'to-90' : 'over-90';
}

function owedBy(clientId: string, invoices: readonly OpenInvoice[], { today, credits }: AgeingFacts): Owed {
  const own = invoices.filter((invoice) => invoice.clientId === clientId);
  const sumAt = (age: Age) =>
    sumMinor(own.filter(({ dueOn }) => ageOf(dueOn, today) === age).map(({ open_minor }) => open_minor));
  return {
    clientId,
    byAge_minor: Object.fromEntries(ages.map((age) => [age, sumAt(age)])) as Record<Age, MinorUnits>,
    open_minor: sumMinor(own.map(({ open_minor }) => open_minor)),
    credit_minor: sumMinor(credits.filter((one) => one.clientId === clientId).map(({ credit_minor }) => credit_minor)),
  };
}

interface AgeingFacts {
  readonly today: Day;
  readonly credits: readonly { readonly clientId: string; readonly credit_minor: MinorUnits }[];
}

/** What is owed by client and age on a day, the largest first; whole minor units of the workshop's currency. */
export function owedByAge(invoices: readonly OpenInvoice[], facts: AgeingFacts): Owed[] {
  const clientIds = [...new Set([...invoices, ...facts.credits].map(({ clientId }) => clientId))];
  return clientIds
    .map((clientId) => owedBy(clientId, invoices, facts))
    .filter(({ open_minor, credit_minor }) => open_minor !== 0 || credit_minor !== 0)
    .toSorted((one, other) => other.open_minor - one.open_minor || (one.clientId < other.clientId ? -1 : 1));
}
