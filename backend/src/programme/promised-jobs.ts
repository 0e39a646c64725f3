import type { Standing } from '#shared/programme/board-schema';
import { minutesBetween, minutesOf, programmeFrame, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { GivenApproval } from '#shared/programme/programme-inputs';
import { promisedWork, type PromisedPlan } from '#shared/programme/promised-plan';
import type { PromisedWork } from '#shared/programme/promised-work';
import { type KeptPlan, planIn, unpackedPlan } from './kept-plan';
import type { ProgrammeRepository, PromisedRow, UnplannedRow } from './programme-repository';

/** A promised job as its plan was kept, told in the minutes of another frame. */
export interface PromisedJob extends PromisedPlan {
  readonly jobId: string;
  readonly standing: Standing;
  readonly holdUntil: string | null;
  readonly kept: KeptPlan;
  /** What is approved, as it is given by now: it may have been since the plan was kept. */
  readonly approvals: KeptPlan['approvals'];
  /** Paces with their stretches in the same minutes. */
  readonly paces: KeptPlan['paces'];
}

function approvalsNow({ approvals }: KeptPlan, row: PromisedRow, frame: ProgrammeFrame): KeptPlan['approvals'] {
  const given = new Map((JSON.parse(row.approvals) as GivenApproval[]).map(({ approvalId, at }) => [approvalId, at]));
  return approvals.map((approval) => {
    const at = given.get(approval.id);
    return { ...approval, given_minutes: at === undefined ? null : minutesOf(at, frame) };
  });
}

function promisedJob(row: PromisedRow, frame: ProgrammeFrame): PromisedJob {
  const kept = unpackedPlan(row.kept);
  const by_minutes = minutesBetween(programmeFrame(kept.firstDay, kept.timeZone), frame);
  const { id: estimateId, jobId, standing, holdUntil } = row;
  const { items, placeHolds } = kept;
  const paces = kept.paces.map(({ id, stretches }) => ({
    id,
    stretches: stretches.map(({ from_minutes, factor }) => ({ from_minutes: from_minutes + by_minutes, factor })),
  }));
  return {
    estimateId,
    jobId,
    standing,
    holdUntil,
    kept,
    approvals: approvalsNow(kept, row, frame),
    items,
    placeHolds,
    paces,
    plan: planIn(kept, frame),
  };
}

/** The work a workshop has promised, in the minutes of a frame; one estimate may be left out, where it is being planned itself. */
export class PromisedJobs {
  constructor(private readonly programmes: ProgrammeRepository) {}

  async all(workshopId: string, today: string, frame: ProgrammeFrame): Promise<PromisedJob[]> {
    return (await this.programmes.promised(workshopId, today)).map((row) => promisedJob(row, frame));
  }

  /** What was accepted without a plan: promised too, and on no day. */
  unplanned(workshopId: string): Promise<UnplannedRow[]> {
    return this.programmes.unplanned(workshopId);
  }

  /** What others are promised, for an estimate that is planned around it. */
  async around(
    estimate: { workshopId: string; id: string },
    today: string,
    frame: ProgrammeFrame,
  ): Promise<PromisedWork[]> {
    const rows = await this.programmes.promised(estimate.workshopId, today, estimate.id);
    return rows.map((row) => promisedWork(promisedJob(row, frame)));
  }
}
