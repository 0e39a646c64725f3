import { endOfWork } from '#shared/drying/end-of-work';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import type { WorkingTime } from '#shared/drying/working-time';

/** A span in clock minutes, from the start of the job. */
export interface Span {
  readonly start_minutes: number;
  readonly end_minutes: number;
}

/** When a pair of hands is busy: spans in their order, none touching another. */
export type BusySpans = readonly Span[];

/** The place of the first span that ends after a moment. */
function placeAfter(busy: BusySpans, at_minutes: number): number {
  let [first, last] = [0, busy.length];
  while (first < last) {
    const middle = (first + last) >> 1;
    if (busy[middle].end_minutes > at_minutes) last = middle;
    else first = middle + 1;
  }
  return first;
}

/** The first free span of work for somebody at or after a moment, laid down at evenings but for nothing else; work of no time is done at once. */
export function freeSpan(
  busy: BusySpans,
  wanted: { readonly from_minutes: number; readonly work_minutes: number },
  time: WorkingTime,
): Span {
  if (wanted.work_minutes === 0) return { start_minutes: wanted.from_minutes, end_minutes: wanted.from_minutes };
  let start_minutes = nextWorkingMinute(wanted.from_minutes, time);
  for (let place = placeAfter(busy, start_minutes); ; place += 1) {
    const end_minutes = endOfWork(start_minutes, wanted.work_minutes, time);
    const clash: Span | undefined = busy[place];
    if (!clash || clash.start_minutes >= end_minutes) return { start_minutes, end_minutes };
    start_minutes = nextWorkingMinute(clash.end_minutes, time);
  }
}

/** The busy spans with one more, which clashes with none of them; a span of no time adds nothing. */
export function busyWith(busy: BusySpans, { start_minutes, end_minutes }: Span): BusySpans {
  if (end_minutes === start_minutes) return busy;
  const place = placeAfter(busy, start_minutes - 1);
  const before = busy[place]?.end_minutes === start_minutes ? busy[place] : null;
  const after: Span | undefined = busy[before ? place + 1 : place];
  const isTouching = after?.start_minutes === end_minutes;
  const joined = {
    start_minutes: before?.start_minutes ?? start_minutes,
    end_minutes: isTouching ? after.end_minutes : end_minutes,
  };
  return busy.toSpliced(place, Number(before !== null) + Number(isTouching), joined);
}
