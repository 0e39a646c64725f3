import type { MomentSpan } from '#shared/programme/shop-calendar';
import type { ProjectStatus } from '#shared/programme/project';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** What is known of a plan at the end: proven best, keeping every rule, proven impossible, or not found before the limit. */
export type ProgrammePlanStatus = ProjectStatus;

/**
 * One task of a plan, all in minutes from the start of the calendar's first day. `spans` are its work, several where nights or absences break it;
 * `dryUntil_minutes` is when the longest of its drying is over, `windowUntil_minutes` when the first of its windows closes. `slack_minutes` is how much
 * later it could start without a later finish of the whole, everybody's order of work kept.
 */
export interface PlannedTask extends MomentSpan {
  readonly taskId: string;
  readonly spans: readonly MomentSpan[];
  readonly personIds: readonly string[];
  readonly dryUntil_minutes: number | null;
  readonly windowUntil_minutes: number | null;
  readonly slack_minutes: number;
  readonly isCritical: boolean;
  /** Why it does not start earlier. */
  readonly waits: readonly Reason[];
}

/**
 * A plan with its proof: nothing finishes before `lowerBound_minutes`; `gap` is the distance in parts of the time from the start to that bound, in a
 * plan backward from a day how much earlier it begins than any could.
 */
export interface Programme {
  readonly status: ProgrammePlanStatus;
  readonly tasks: readonly PlannedTask[];
  /** The moment it was planned from: nothing that had not happened might start before it. Its waits and its gap are reckoned from here. */
  readonly from_minutes: number;
  readonly start_minutes: number;
  readonly finish_minutes: number | null;
  readonly lowerBound_minutes: number;
  readonly gap: number | null;
  /** Whole plans tried. */
  readonly plans: number;
  /** Why there is no plan, or what of it to know; about the task concerned. */
  readonly findings: readonly Finding[];
  /** The lags that contradict each other, by their ids. */
  readonly cycle: readonly string[];
}
