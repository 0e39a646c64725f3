import { addDays } from '#shared/calendar/add-days';
import { dayOfMinutes, instantOf, minutesOfDay, type ProgrammeFrame } from '#shared/programme/programme-frame';

const day_minutes = 1440;
const two = (figure: number): string => String(figure).padStart(2, '0');

/** By how much the clock on the wall is behind the minutes of its day, once it was changed that day. */
function changed_minutes(day: string, frame: ProgrammeFrame): number {
  return minutesOfDay(addDays(day, 1), frame) - minutesOfDay(day, frame) - day_minutes;
}

/** The minute of a programme at which the clock on the workshop's wall shows a day and time (2026-06-04T16:10); undefined where that is neither. */
export function minutesOfClock(text: string, frame: ProgrammeFrame): number | undefined {
  const [, day, hour, minute] = /^(\d{4}-\d{2}-\d{2})T(\d{2}):(\d{2})/.exec(text) ?? [];
  if (!day) return undefined;
  return minutesOfDay(day, frame) + changed_minutes(day, frame) + Number(hour) * 60 + Number(minute);
}

/** The other way round. */
export function clockOfMinutes(minutes: number, frame: ProgrammeFrame): string {
  const day = dayOfMinutes(minutes, frame);
  const wall = Math.max(0, minutes - minutesOfDay(day, frame) - changed_minutes(day, frame));
  return `${day}T${two(Math.floor(wall / 60))}:${two(wall % 60)}`;
}

/** An instant of the working day, for what is only known by its day. */
export const morningOf = (day: string, frame: ProgrammeFrame): string =>
  instantOf(minutesOfDay(day, frame) + 8 * 60, frame);
