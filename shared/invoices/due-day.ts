import { addDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';

/** The day an invoice falls due: the one entered, else so many calendar days after it is issued; RangeError for what is no day. */
export const dueDay = (issuedOn: Day, entered: Day | null, due_days: number): Day =>
  entered ?? addDays(issuedOn, due_days);
