import { endOfWork } from '#shared/drying/end-of-work';
import { nextWorkingMinute } from '#shared/drying/next-working-minute';
import type { WorkingTime } from '#shared/drying/working-time';

/** A span in clock minutes, from the start of the job. */
export interface Span {
  readonly start_minutes: number;
  readonly end_minutes: number;
}

/** The first free span of work for somebody at or after a moment, laid down at evenings but for nothing else; work of no time is done at once. */
export function freeSpan(
  taken: readonly Span[],
  wanted: { readonly from_minutes: number; readonly work_minutes: number },
  time: WorkingTime,
): Span {
  if (wanted.work_minutes === 0) return { start_minutes: wanted.from_minutes, end_minutes: wanted.from_minutes };
  let start = nextWorkingMinute(wanted.from_minutes, time);
  for (;;) {
    const end = endOfWork(start, wanted.work_minutes, time);
    const clash = taken.find((span) => span.start_minutes < end && span.end_minutes > start);
    if (!clash) return { start_minutes: start, end_minutes: end };
    start = nextWorkingMinute(clash.end_minutes, time);
  }
}
