import { addDays, compareDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';

/** How far planning looks either way: calendars are laid out day by day from the first that is named, so centuries would stop everybody. */
const [back_days, ahead_days] = [1826, 2190];

/** Where today is, and in which zone. */
interface Here {
  readonly today: Day;
  readonly timeZone: string;
}

interface Named {
  readonly path: Complaint['path'];
  readonly day: Day;
}

function refuseFar(named: readonly Named[], today: Day): void {
  const [first, last] = [addDays(today, -back_days), addDays(today, ahead_days)];
  const far = named.filter(({ day }) => compareDays(day, first) < 0 || compareDays(day, last) > 0);
  if (far.length === 0) return;
  const complaints = far.map(({ path }) => ({ path, code: 'programme-day-far' as const, values: {} }));
  throw new Rejection('invalid', 'problem-invalid', { complaints });
}

const dayIn = (instant: string, timeZone: string): Day => dayOfInstant(Date.parse(instant), timeZone);

/** Refuses inputs of a programme that name a day planning does not reach. */
export function refuseFarInputs({ day, pins, approvals }: ProgrammeInputs, { today, timeZone }: Here): void {
  const pinned = pins.map(({ at }, place) => ({ path: ['pins', place, 'at'], day: dayIn(at, timeZone) }));
  const given = approvals.map(({ at }, place) => ({ path: ['approvals', place, 'at'], day: dayIn(at, timeZone) }));
  refuseFar([{ path: ['day'], day }, ...pinned, ...given], today);
}

/** Refuses a mark of a day planning does not reach. */
export function refuseFarMark(at: Date, { today, timeZone }: Here): void {
  refuseFar([{ path: ['at'], day: dayOfInstant(at.getTime(), timeZone) }], today);
}
