import { holdPoints } from '#shared/buildups/buildup';
import { addDays, compareDays } from '#shared/calendar/add-days';
import type { Day } from '#shared/calendar/day';
import { exceptionsByDay, hoursOf } from '#shared/programme/calendar-days';
import type { ProgrammeApproval } from '#shared/programme/lot-programme';
import type { ProgrammeDates } from '#shared/programme/programme-dates';
import { dayOfMinutes, minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeInputs } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { Shop } from '#shared/programme/shop';
import type { ShopCalendar } from '#shared/programme/shop-calendar';
import type { Finding } from '#shared/words/finding';
import type { WordCode } from '#shared/words/word-code';

/** What the dates of a plan are read from. */
export interface DatesAsked {
  readonly plan: Programme;
  readonly request: ProgrammeRequest;
  readonly approvals: readonly ProgrammeApproval[];
  readonly inputs: ProgrammeInputs;
  readonly shop: Shop;
  readonly frame: ProgrammeFrame;
  /** Other jobs it is planned around. */
  readonly promisedJobs: number;
}

/** Nobody waits longer for a working day than this; in days. */
const longestBreak_days = 400;

const isWorked = (day: Day, calendar: ShopCalendar): boolean =>
  hoursOf(day, calendar.week, exceptionsByDay(calendar.exceptions)).length > 0;

/** The first day worked from a day on, and so many days worked later. */
function workedDayAfter(day: Day, further: number, calendar: ShopCalendar): Day {
  let [reached, left] = [day, further];
  for (let tried = 0; tried < longestBreak_days * (further + 1); tried += 1) {
    if (isWorked(reached, calendar)) {
      if (left === 0) return reached;
      left -= 1;
    }
    reached = addDays(reached, 1);
  }
  return reached;
}

/** When nothing is wet any more. */
const dryBy = ({ tasks, finish_minutes }: Programme): number =>
  Math.max(finish_minutes ?? 0, ...tasks.map(({ end_minutes, dryUntil_minutes }) => dryUntil_minutes ?? end_minutes));

/** The day a moment begins, or the next where the moment lies within it. */
function dayFrom(minutes: number, frame: ProgrammeFrame): Day {
  const day = dayOfMinutes(minutes, frame);
  return minutesOfDay(day, frame) === minutes ? day : addDays(day, 1);
}

const approvalCodes = {
  'carving-approved': 'programme-assumes-carving',
  'sample-approved': 'programme-assumes-sample',
  'top-dry-fitted': 'programme-assumes-top',
} as const satisfies Record<string, WordCode>;

const note = (code: WordCode, values: Finding['values']): Finding => ({ kind: 'note', code, values });

/** Approvals that are still waited for, by kind: how many, and how long the slowest of them usually takes. */
function approvalNotes(approvals: readonly ProgrammeApproval[]): Finding[] {
  return holdPoints.flatMap((hold) => {
    const waited = approvals.filter((approval) => approval.hold === hold && approval.given_minutes === null);
    const things = new Set(waited.map(({ name }) => name)).size;
    const days = Math.max(0, ...waited.map(({ usual_days }) => usual_days));
    return things === 0 ? [] : [note(approvalCodes[hold], { things, days })];
  });
}

function airNote({ inputs, request, shop }: DatesAsked): Finding[] {
  if (inputs.climate) return [note('programme-assumes-air', { ...inputs.climate })];
  if (shop.climates.length === 12) return [note('programme-assumes-months', {})];
  return request.paces.length > 0 ? [note('programme-assumes-estimate-air', {})] : [];
}

function assumptionsOf(asked: DatesAsked): Finding[] {
  const { request, inputs, approvals, promisedJobs } = asked;
  const share_percent = request.calendar.productiveShare_percent;
  return [
    note('programme-assumes-people', { people: request.people.length, share_percent }),
    ...airNote(asked),
    note('programme-assumes-promised', { jobs: promisedJobs }),
    ...approvalNotes(approvals),
    ...(inputs.inHand_days > 0 ? [note('programme-assumes-in-hand', { days: inputs.inHand_days })] : []),
  ];
}

/** How many days from one to another the workshop works, both counted. */
function workedDays(first: Day, last: Day, calendar: ShopCalendar): number {
  const byDay = exceptionsByDay(calendar.exceptions);
  let days = 0;
  for (let day = first; compareDays(day, last) <= 0; day = addDays(day, 1))
    if (hoursOf(day, calendar.week, byDay).length > 0) days += 1;
  return days;
}

/** The dates of a finished plan in the workshop's zone with what they assume; null where the plan has no finish or no work. */
export function datesOfProgramme(asked: DatesAsked): ProgrammeDates | null {
  const { plan, request, frame, inputs } = asked;
  if (plan.finish_minutes === null || plan.tasks.length === 0) return null;
  const startsOn = dayOfMinutes(Math.min(...plan.tasks.map((task) => task.start_minutes)), frame);
  const lastWork = Math.max(...plan.tasks.map((task) => task.end_minutes));
  const finishesOn = dayOfMinutes(Math.max(0, lastWork - 1), frame);
  return {
    startsOn,
    finishesOn,
    offeredOn: workedDayAfter(dayFrom(dryBy(plan), frame), inputs.inHand_days, request.calendar),
    workingDays: workedDays(startsOn, finishesOn, request.calendar),
    assumptions: assumptionsOf(asked),
  };
}
