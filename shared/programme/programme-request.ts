import type { MomentSpan, Person, ShopCalendar } from '#shared/programme/shop-calendar';
import type { SearchLimit } from '#shared/programme/project';
import type { Programme } from '#shared/programme/programme-plan';

/**
 * Work that has begun: where it was done, by whom, and what was left of it in hands-on minutes (0: finished at `end_minutes`) at a moment, since when it went
 * on in its people's hours; without one it is left at the moment that is planned from.
 */
export interface Happened {
  readonly start_minutes: number;
  readonly end_minutes: number;
  readonly left_minutes: number;
  readonly leftAt_minutes?: number;
  readonly personIds: readonly string[];
}

/**
 * One stretch of work on a lot or a carving. `crew` people are at it together for `handsOn_minutes`; where it may be shared, more of them divide the
 * work up to `mostPeople`. A crew of 0 waits for nobody. What may not be broken is begun and ended on one day.
 */
export interface ProgrammeTask {
  readonly id: string;
  /** In the trade's words, for reasons and findings. */
  readonly name: string;
  /** What it belongs to: the lot, or the member that is carved. */
  readonly lotId: string;
  readonly gradeId: string;
  readonly handsOn_minutes: number;
  readonly crew: number;
  readonly mostPeople: number;
  readonly isBreakable: boolean;
  readonly release_minutes: number;
  readonly pinned_minutes: number | null;
  readonly happened: Happened | null;
}

export type TaskPoint = 'start' | 'end';

/** Minutes of the clock day and night, minutes of the workshop's hours, or working days (the same minute so many working days later). */
export type LagTime = 'clock' | 'work' | 'working-days';

/**
 * A lag between two tasks: at least `least` and at most `most` (null: no limit), in minutes, or in days for working days. `paceId` names a pace of the
 * request by which a lag of clock time runs slower or faster (drying); null runs by the clock.
 */
export interface ProgrammeLag {
  readonly id: string;
  readonly fromTaskId: string;
  readonly fromPoint: TaskPoint;
  readonly toTaskId: string;
  readonly toPoint: TaskPoint;
  readonly least: number;
  readonly most: number | null;
  readonly time: LagTime;
  readonly paceId: string | null;
}

/** From a moment on, something takes `factor` times as long as at the reference; the first stretch holds before its moment too. */
export interface PaceStretch {
  readonly from_minutes: number;
  readonly factor: number;
}

/** How fast a kind of drying goes through the year; stretches in order. */
export interface Pace {
  readonly id: string;
  readonly stretches: readonly PaceStretch[];
}

/** Racks or benches of one kind, and how much of them is promised elsewhere. */
export interface Place {
  readonly id: string;
  readonly name: string;
  readonly capacity: number;
  readonly taken: readonly (MomentSpan & { readonly amount: number })[];
}

/** Room taken from the start of a task to the end of another (or of the same). */
export interface PlaceHold {
  readonly placeId: string;
  readonly amount: number;
  readonly fromTaskId: string;
  readonly untilTaskId: string;
}

/** Somebody's approval between two tasks (or from the start of the programme, null), with its usual working days, or the moment it was given. */
export interface ApprovalHold {
  readonly id: string;
  readonly name: string;
  readonly afterTaskId: string | null;
  readonly beforeTaskId: string;
  readonly usual_days: number;
  readonly given_minutes: number | null;
}

/** Another size for one lot, worked out by the caller: what would stand in place of the lags of the same ids. */
export interface OtherSize {
  readonly name: string;
  readonly lags: readonly ProgrammeLag[];
}

/** Everything a programme is made from. `start_minutes` is the first moment anything may start that has not happened. */
export interface ProgrammeRequest {
  readonly calendar: ShopCalendar;
  readonly start_minutes: number;
  readonly tasks: readonly ProgrammeTask[];
  readonly lags: readonly ProgrammeLag[];
  readonly approvals: readonly ApprovalHold[];
  readonly people: readonly Person[];
  readonly places: readonly Place[];
  readonly placeHolds: readonly PlaceHold[];
  readonly paces: readonly Pace[];
}

/**
 * How it is planned. `backwardFrom_minutes`: everything as late as it still ends by then. `previous`: a plan from which nothing moves that need not.
 * `incumbent`: a plan to be better than; where it still keeps every rule the answer never finishes later. `limit.nodes` counts whole plans tried.
 */
export interface ProgrammeSearch {
  readonly limit?: SearchLimit;
  readonly seed?: number;
  readonly backwardFrom_minutes?: number;
  readonly previous?: Programme;
  readonly incumbent?: Programme;
  readonly onBetter?: (plan: Programme) => void;
}
