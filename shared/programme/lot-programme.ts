import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { ApprovalHold, ProgrammeLag, ProgrammeTask } from '#shared/programme/programme-request';
import type { HoldPoint } from '#shared/buildups/buildup';

/** A task with what it is for whoever reads it. */
export interface ItemTask {
  readonly task: ProgrammeTask;
  readonly item: ProgrammeItem;
}

/** An approval that is waited for: what kind, and what is approved. */
export interface ProgrammeApproval extends ApprovalHold {
  readonly hold: HoldPoint;
}

/** The tasks one lot, or the carving of one member, brings to a programme, and the lags between them. */
export interface LotProgramme {
  readonly tasks: readonly ItemTask[];
  readonly lags: readonly ProgrammeLag[];
}
