import { dayLength_minutes, dayOf } from '#shared/drying/day-length-minutes';
import type { WorkingTime } from '#shared/drying/working-time';

/** A stretch of time, in elapsed minutes from the start of the job. */
export interface Stretch {
  readonly from_minutes: number;
  readonly to_minutes: number;
}

const isWorked = (day: number, { days }: WorkingTime): boolean => day % 7 < days;

const daysOf = (to_minutes: number): number[] =>
  Array.from({ length: Math.ceil(to_minutes / dayLength_minutes) }, (_, day) => day);

/** A stretch as it is worked: cut at the end of each working day, closed days left out. */
export function workingParts({ from_minutes, to_minutes }: Stretch, time: WorkingTime): Stretch[] {
  return daysOf(to_minutes)
    .slice(dayOf(from_minutes))
    .filter((day) => isWorked(day, time))
    .map((day) => ({
      from_minutes: Math.max(from_minutes, day * dayLength_minutes),
      to_minutes: Math.min(to_minutes, day * dayLength_minutes + time.day_minutes),
    }))
    .filter((part) => part.to_minutes > part.from_minutes);
}

/** When nobody works, up to a moment: nights, and days the workshop is closed, joined where they touch. */
export function closedTimes(to_minutes: number, time: WorkingTime): Stretch[] {
  const closed = daysOf(to_minutes).map((day) => ({
    from_minutes: day * dayLength_minutes + (isWorked(day, time) ? time.day_minutes : 0),
    to_minutes: (day + 1) * dayLength_minutes,
  }));
  return closed.reduce<Stretch[]>((joined, next) => {
    const last = joined.at(-1);
    if (last?.to_minutes !== next.from_minutes) return [...joined, next];
    return [...joined.slice(0, -1), { ...last, to_minutes: next.to_minutes }];
  }, []);
}
