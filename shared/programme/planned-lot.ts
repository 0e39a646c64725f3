import type { LotToPlan, PlannedBlock } from '#shared/programme/lot-tasks';

/** A lot made into tasks. */
export interface PlannedLot {
  readonly lot: LotToPlan;
  readonly blocks: readonly PlannedBlock[];
}
