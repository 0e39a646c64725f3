import type { Day } from '#shared/calendar/day';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { startOfDay_ms } from '#shared/programme/odd-days';

/** What the minutes of a programme are counted from: the start of a day in a workshop's IANA zone. They run on through every change of the clocks. */
export interface ProgrammeFrame {
  readonly firstDay: Day;
  readonly timeZone: string;
  /** Milliseconds since 1970 UTC. */
  readonly startsAt_ms: number;
}

const minute_ms = 60_000;

/** The frame that begins with a day; RangeError for a day or a zone there is not. */
export const programmeFrame = (firstDay: Day, timeZone: string): ProgrammeFrame => ({
  firstDay,
  timeZone,
  startsAt_ms: startOfDay_ms(firstDay, timeZone),
});

/** The instant of a minute, in milliseconds since 1970 UTC. */
export const millisecondsOf = (minutes: number, { startsAt_ms }: ProgrammeFrame): number =>
  startsAt_ms + minutes * minute_ms;

/** The instant of a minute as ISO 8601 text in UTC. */
export const instantOf = (minutes: number, frame: ProgrammeFrame): string =>
  new Date(millisecondsOf(minutes, frame)).toISOString();

/** The minute an instant (ISO 8601) falls into, counted from the start of the frame; negative before it. */
export const minutesOf = (instant: string, { startsAt_ms }: ProgrammeFrame): number =>
  Math.floor((Date.parse(instant) - startsAt_ms) / minute_ms);

/** The first minute that does not begin before an instant (ISO 8601): what is planned from now on starts no earlier. */
export const minutesFrom = (instant: string, { startsAt_ms }: ProgrammeFrame): number =>
  Math.ceil((Date.parse(instant) - startsAt_ms) / minute_ms);

/** The day of a minute in the frame's zone. */
export const dayOfMinutes = (minutes: number, frame: ProgrammeFrame): Day =>
  dayOfInstant(millisecondsOf(minutes, frame), frame.timeZone);

/** The minute at which a day begins in the frame's zone. */
export const minutesOfDay = (day: Day, { startsAt_ms, timeZone }: ProgrammeFrame): number =>
  Math.floor((startOfDay_ms(day, timeZone) - startsAt_ms) / minute_ms);

/** What is added to the minutes of one frame to say the same moments in another. */
export const minutesBetween = (from: ProgrammeFrame, to: ProgrammeFrame): number =>
  Math.round((from.startsAt_ms - to.startsAt_ms) / minute_ms);
