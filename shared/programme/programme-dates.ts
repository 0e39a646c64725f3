import type { Day } from '#shared/calendar/day';
import type { Finding } from '#shared/words/finding';

/** The dates of a programme in the workshop's zone, and what they assume; `offeredOn` is the first day worked after all is dry, with the days in hand. */
export interface ProgrammeDates {
  readonly startsOn: Day;
  readonly finishesOn: Day;
  readonly offeredOn: Day;
  /** Days worked from the first to the last, both counted. */
  readonly workingDays: number;
  readonly assumptions: readonly Finding[];
}
