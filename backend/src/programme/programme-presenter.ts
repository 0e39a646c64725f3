import { instantOf, millisecondsOf, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { ProgrammeApproval } from '#shared/programme/lot-programme';
import type { EstimateProgramme } from '#shared/programme/programme-of-estimate';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { verifiedPlan } from '#shared/programme/verified-plan';
import type { Estimates } from '../estimates';
import type { KeptPlan } from './kept-plan';
import type { ProgrammeContext } from './programme-context';
import type { ProgrammeRow } from './programme-model';

type IssueRows = Awaited<ReturnType<Estimates['issues']['ofEstimate']>>;

/** What is sent of a programme: the request from now on, the one its plan is judged by, the slot that is held. */
export interface ShownProgramme {
  readonly planned: EstimateProgramme;
  readonly standing: EstimateProgramme | null;
  /** The plan that was kept, in the minutes of the context's frame. */
  readonly kept: Pick<KeptPlan, 'plan' | 'dates'> | null;
  readonly hold: ProgrammeAnswer['hold'];
  readonly isAccepted: boolean;
}

/** The slot that is held, if its issue is still with the client and its validity has not ended. */
export function holdOf(row: ProgrammeRow | undefined, issues: IssueRows, today: string): ProgrammeAnswer['hold'] {
  const issue = issues.find(({ id }) => id === row?.holdIssueId);
  if (!row?.holdUntil || !issue || issue.state !== 'sent' || row.holdUntil < today) return null;
  return { issueId: issue.id, letter: issue.letter, until: row.holdUntil };
}

/** How minutes of a frame are read. */
export const presentFrame = (frame: ProgrammeFrame) => ({
  firstDay: frame.firstDay,
  startsAt: new Date(millisecondsOf(0, frame)).toISOString(),
  timeZone: frame.timeZone,
});

export const presentApproval = (approval: ProgrammeApproval, frame: ProgrammeFrame) => ({
  approvalId: approval.id,
  hold: approval.hold,
  name: approval.name,
  beforeTaskId: approval.beforeTaskId,
  usual_days: approval.usual_days,
  givenAt: approval.given_minutes === null ? null : instantOf(approval.given_minutes, frame),
});

function presentPlan({ kept, standing }: ShownProgramme) {
  if (!kept || !standing) return { plan: null, isCurrent: false, broken: [], dates: null };
  const { plan } = kept;
  const stopping = standing.findings.filter(({ kind }) => kind === 'refuse');
  const broken = [...stopping, ...verifiedPlan(plan, standing.request).broken];
  return { plan, isCurrent: broken.length === 0, broken, dates: kept.dates };
}

/** A programme as it is sent; the plan in the minutes of the frame that is sent with it. */
export function presentProgramme(context: ProgrammeContext, shown: ShownProgramme): ProgrammeAnswer {
  const { whole, row, inputs, marks, frame } = context;
  const { request, items, approvals, findings, otherSizes } = shown.planned;
  return {
    estimateId: whole.estimate.id,
    version: row?.version ?? 0,
    inputs,
    marks,
    isAccepted: shown.isAccepted,
    ...presentFrame(frame),
    request,
    items,
    approvals: approvals.map((approval) => presentApproval(approval, frame)),
    findings,
    otherSizes,
    ...presentPlan(shown),
    hold: shown.hold,
  } as ProgrammeAnswer;
}
