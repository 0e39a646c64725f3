import type { CalendarDay } from '#shared/programme/calendar-days';
import type { Pace } from '#shared/programme/programme-request';
import type { WorkingSpans } from '#shared/programme/working-spans';

/** What goes on while time goes by (the clock, working minutes, working days, drying): how far it is at a moment, never falling, and back. */
export interface LagProgress {
  readonly at: (moment: number) => number;
  /** The first whole minute by which it has come so far. */
  readonly first: (progress: number) => number;
  /** The last whole minute at which it has come no further. */
  readonly last: (progress: number) => number;
}

/** Figures that differ by less are the same: rounding of a division must not cost a minute. */
const hair = 1e-6;

/** The clock, day and night. */
export const clockProgress: LagProgress = {
  at: (moment) => moment,
  first: (progress) => progress,
  last: (progress) => progress,
};

/** Minutes of the workshop's hours. */
export const workProgress = (spans: WorkingSpans): LagProgress => ({
  at: (moment) => spans.workedBy(moment),
  first: (progress) => (progress <= 0 ? -Infinity : spans.momentOf(progress)),
  last: (progress) => {
    if (progress < 0) return -Infinity;
    const moment = spans.momentOf(progress);
    return moment === Infinity ? Infinity : spans.startAt(moment);
  },
});

/** A line through corners, which rise in moment and never fall in progress; straight on before the first and after the last. */
interface Corner {
  readonly moment: number;
  readonly progress: number;
}

function placeOf(corners: readonly Corner[], isBefore: (corner: Corner) => boolean): number {
  let [first, last] = [1, corners.length - 1];
  while (first < last) {
    const middle = (first + last) >> 1;
    if (isBefore(corners[middle])) first = middle + 1;
    else last = middle;
  }
  return first;
}

function between(corners: readonly Corner[], place: number, known: { moment?: number; progress?: number }): number {
  const [from, to] = [corners[place - 1], corners[place]];
  const slope = (to.progress - from.progress) / (to.moment - from.moment);
  if (known.moment !== undefined) return from.progress + (known.moment - from.moment) * slope;
  return from.moment + ((known.progress ?? 0) - from.progress) / slope;
}

function alongCorners(corners: readonly Corner[]): LagProgress {
  return {
    at: (moment) =>
      between(
        corners,
        placeOf(corners, (corner) => corner.moment < moment),
        { moment },
      ),
    first: (progress) => {
      const sought = progress - hair;
      return Math.ceil(
        between(
          corners,
          placeOf(corners, (corner) => corner.progress < sought),
          { progress: sought },
        ),
      );
    },
    last: (progress) => {
      const sought = progress + hair;
      return Math.floor(
        between(
          corners,
          placeOf(corners, (corner) => corner.progress <= sought),
          { progress: sought },
        ),
      );
    },
  };
}

/** Working days, each day of work counting by the share of it that has gone by; RangeError where no day is worked. */
export function dayProgress(days: readonly CalendarDay[], isWorked: (at: number) => boolean): LagProgress {
  const corners: Corner[] = [{ moment: days[0].start_minutes, progress: 0 }];
  let progress = 0;
  days.forEach(({ start_minutes, length_minutes }, at) => {
    if (isWorked(at)) progress += 1;
    corners.push({ moment: start_minutes + length_minutes, progress });
  });
  if (progress === 0) throw new RangeError('a calendar needs a working day');
  return alongCorners([...corners, { moment: (corners.at(-1)?.moment ?? 0) + 1440, progress: progress + 1 }]);
}

/** Drying at a pace, ∫dt ÷ factor in minutes at the reference (calculated as `drying` does for stretches of air); RangeError for a factor not above 0. */
export function paceProgress({ stretches }: Pace): LagProgress {
  if (stretches.length === 0 || stretches.some(({ factor }) => !(factor > 0)))
    throw new RangeError('a pace has stretches with factors above 0');
  const corners: Corner[] = [{ moment: stretches[0].from_minutes, progress: 0 }];
  stretches.slice(1).forEach(({ from_minutes }, before) => {
    const last = corners[before];
    const gone = (from_minutes - last.moment) / stretches[before].factor;
    corners.push({ moment: from_minutes, progress: last.progress + gone });
  });
  const [first, last, end] = [stretches[0], stretches[stretches.length - 1], corners[corners.length - 1]];
  const far = 1e9;
  return alongCorners([
    { moment: corners[0].moment - far, progress: -far / first.factor },
    ...corners,
    { moment: end.moment + far, progress: end.progress + far / last.factor },
  ]);
}
