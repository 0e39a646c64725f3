import type { Day } from '#shared/calendar/day';
import type { Climate } from '#shared/drying/climate';
import type { Choice } from '#shared/estimates/draft';

/** How one lot is worked, where it is not as proposed: in so many portions, by so many hands, on so many places of a rack. */
export interface LotInput {
  readonly lotId: string;
  readonly portions: number | null;
  readonly crew: number | null;
  readonly mostPeople: number | null;
  readonly places: number | null;
}

/**
 * How many hands one kind of work takes at once, where it is not as its lot says: a step of a lot, whatever the coat and portion, or the carving of a
 * member by one grade (`workIdOf`).
 */
export interface WorkHands {
  readonly workId: string;
  readonly crew: number;
}

/** A task that starts where a person put it; an instant in UTC (ISO 8601). */
export interface TaskPin {
  readonly taskId: string;
  readonly at: string;
}

/** An approval that was given, and when. */
export interface GivenApproval {
  readonly approvalId: string;
  readonly at: string;
}

/**
 * What a person enters of a programme: planned forward from a day or backward from the day it has to be delivered, in the workshop's air by month
 * (climate null) or in a given air, with so many working days kept in hand before the day that is offered.
 */
export interface ProgrammeInputs {
  readonly direction: 'forward' | 'backward';
  readonly day: Day;
  readonly climate: Climate | null;
  readonly choice: Choice;
  readonly inHand_days: number;
  readonly lots: readonly LotInput[];
  readonly hands: readonly WorkHands[];
  readonly pins: readonly TaskPin[];
  readonly approvals: readonly GivenApproval[];
}

/** Where a task of a programme really stands; instants in UTC (ISO 8601), `endedAt` null while it is in work. */
export interface TaskMark {
  readonly taskId: string;
  readonly startedAt: string;
  readonly endedAt: string | null;
  /** Hands-on minutes that were still to do at `leftAt`; 0 once it is finished. */
  readonly left_minutes: number;
  readonly leftAt: string;
  readonly personIds: readonly string[];
}
