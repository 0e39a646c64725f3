import type { HoldPoint } from '#shared/buildups/buildup';
import type { ProgrammeApproval } from '#shared/programme/lot-programme';
import type { LotToPlan, PlannedBlock, PortionStep } from '#shared/programme/lot-tasks';

/** The carving a lot waits for: the member, its name, and the task that ends its carving. */
export interface CarvedMember {
  readonly memberId: string;
  readonly name: string;
  readonly lastTaskId: string | null;
}

/** What the approvals of a lot rest on: its members as they are carved, and the usual waits in working days. */
export interface ApprovalsAsked {
  readonly members: readonly CarvedMember[];
  readonly holds_days: Readonly<Record<HoldPoint, number>>;
}

interface Waiting {
  readonly hold: HoldPoint;
  readonly name: string;
  readonly about: string;
  readonly afterTaskId: string | null;
}

/** A sample board is asked for when the programme starts, carving when it is done, the top when all it stands on is carved. */
function waitingFor(hold: HoldPoint, lot: LotToPlan, { members }: ApprovalsAsked): Waiting[] {
  if (hold === 'sample-approved') return [{ hold, name: lot.name, about: lot.sequence.lotId, afterTaskId: null }];
  const carved = members.filter(({ lastTaskId }) => lastTaskId !== null);
  if (hold === 'carving-approved')
    return carved.map(({ memberId, name, lastTaskId }) => ({ hold, name, about: memberId, afterTaskId: lastTaskId }));
  const asked = carved.length > 0 ? carved : [{ memberId: '', lastTaskId: null }];
  return asked.map(({ memberId, lastTaskId }) => ({ hold, name: lot.piece, about: memberId, afterTaskId: lastTaskId }));
}

function approvalsBefore({ step, tasks }: PortionStep, lot: LotToPlan, asked: ApprovalsAsked): ProgrammeApproval[] {
  const beforeTaskId = tasks[0].task.id;
  return step.holds
    .filter((hold) => asked.holds_days[hold] > 0)
    .flatMap((hold) => waitingFor(hold, lot, asked))
    .map(({ hold, name, about, afterTaskId }) => ({
      id: [beforeTaskId, hold, about].join('#'),
      ...{ hold, name, afterTaskId, beforeTaskId },
      usual_days: asked.holds_days[hold],
      given_minutes: null,
    }));
}

/** The approvals the steps of a lot wait for, with their usual working days; one that takes no time is left out. */
export const lotApprovals = (
  blocks: readonly PlannedBlock[],
  lot: LotToPlan,
  asked: ApprovalsAsked,
): ProgrammeApproval[] =>
  blocks.flatMap(({ portions }) =>
    portions.flatMap((steps) => steps.flatMap((step) => approvalsBefore(step, lot, asked))),
  );
