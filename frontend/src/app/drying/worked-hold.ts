import type { HoldPoint } from '#shared/buildups/buildup';

/** A wait for somebody, in elapsed minutes from the start of the job; lots that wait for the same thing at the same time wait together. */
export interface WorkedHold {
  readonly hold: HoldPoint;
  readonly from_minutes: number;
  readonly to_minutes: number;
  readonly usual_days: number;
  /** What waits: each lot by its name, with the step of it. */
  readonly waiting: readonly { readonly lot: string; readonly step: string; readonly start_minutes: number | null }[];
}
