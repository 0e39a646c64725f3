import type { HoldPoint, MissedWindow, StepKind, StepLag } from '#shared/buildups/buildup';
import type { Reason } from '#shared/words/reason';

/**
 * One step of a lot in a given air, all times in whole minutes, rounded up. `opens` and `closes` run from the end of its last coat: the next step
 * starts between them (closes null stands open). Limits that never scale are given as they stand in the card.
 */
export interface SequenceStep {
  readonly stepId: string;
  readonly kind: StepKind;
  readonly name: string;
  readonly gradeId: string;
  readonly coats: number;
  /** Hands-on of all coats together, set-up included. */
  readonly handsOn_minutes: number;
  readonly betweenCoats_minutes: number;
  readonly latestCoat_minutes: number | null;
  readonly opens_minutes: number;
  readonly closes_minutes: number | null;
  readonly endsInWindow: boolean;
  readonly wholeWithin_minutes: number | null;
  readonly lags: readonly StepLag[];
  readonly holds: readonly HoldPoint[];
  readonly missed: MissedWindow | null;
  readonly factor: number;
  readonly isClipped: boolean;
  readonly reasons: readonly Reason[];
}
