import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import { audienceOf } from '#shared/actor/role';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import type { CostedEstimate, PricedEstimate } from '#shared/estimates/estimate-schema';
import { chosenNames } from '#shared/estimates/chosen-names';
import type { Choice } from '#shared/estimates/draft';
import { issueLetter } from '#shared/estimates/issue-letter';
import { lineDifferences, type LineDifference, type NamedLines } from '#shared/estimates/line-differences';
import type { Snapshot } from '#shared/estimates/snapshot';
import { Rejection } from '#shared/problems/rejection';
import type { Doer } from '../audit';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import type { EstimateRow } from './estimate-model';
import { presentEstimate } from './estimate-presenter';
import { frozenSnapshot, thawedSnapshot, wholeOfSnapshot } from './frozen-snapshot';
import { IssueFreezing } from './issue-freezing';
import type { IssueParts } from './issue-parts';
import type { IssueRow } from './issue-model';
import { mayBeIssued, mayBeMarked } from './issue-policy';
import { presentFrozenDates } from './issue-presenter';

export interface IssueRequest {
  readonly version: number;
  readonly note: string;
  readonly acceptsOldCard: boolean;
}

const namedLines = ({ draft, figures }: Pick<Snapshot, 'draft' | 'figures'>): NamedLines => ({
  lines: figures.price.lines,
  memberNames: Object.fromEntries(draft.members.map((member) => [member.id, member.name])),
});

/** Where an issue stands from a day on; what was chosen where its client accepted it on the page. */
export interface IssueMarking {
  readonly state: 'sent' | 'accepted' | 'declined';
  readonly day: string;
  readonly note: string;
  readonly choice?: Choice;
}

const auditCodes = {
  sent: 'history-issue-sent',
  accepted: 'history-issue-accepted',
  declined: 'history-issue-declined',
} as const;

/** A marking as the history tells it, with the alternatives by their names. */
function markingDeed(issue: IssueRow, number: string, { state, choice = [] }: IssueMarking) {
  const values = { letter: issue.letter, number };
  if (choice.length === 0) return { code: auditCodes[state], values };
  const names = chosenNames(thawedSnapshot(issue).draft.settings.alternatives, choice);
  return { code: 'history-issue-accepted-with', values: { ...values, chosen: names.join(', ') } } as const;
}

/** An open issue of an earlier calculator is accepted as it stands: its alternatives are worked by none any more. */
const mayChooseNoMore = ({ state }: IssueRow, { draft, calculatorVersion: worked }: Snapshot): boolean =>
  (state === 'issued' || state === 'sent') && draft.settings.alternatives.length > 0 && worked !== calculatorVersion;

/** Issues: freezing an estimate with its papers, reading them back, and marking where they stand with the client. */
export class IssueService {
  constructor(private readonly parts: IssueParts) {}

  async ofEstimate(workshopId: string, estimateId: string): Promise<IssueRow[]> {
    await this.parts.estimates.get(workshopId, estimateId);
    return this.parts.issues.ofEstimate(workshopId, estimateId);
  }

  /** Freezes the next issue, all or nothing: snapshot, papers, letter, history and the state of the one before. */
  async issue(actor: Actor, estimateId: string, request: IssueRequest): Promise<IssueRow> {
    const { workshopId } = actor;
    await this.parts.estimates.lock(workshopId, estimateId);
    const whole = await this.parts.drafts.whole(workshopId, estimateId);
    const figures = await this.parts.drafts.figures(whole);
    const inForce = await this.parts.cards.inForce(workshopId);
    mayBeIssued({ whole, figures, request, cardInForceId: inForce.id });
    if (whole.estimate.kind === 'variation')
      await this.parts.mustHold(workshopId, whole.estimate.jobId, figures.price.taxes);
    const before = await this.parts.issues.newest(workshopId, estimateId);
    const freezing = new IssueFreezing(this.parts);
    const snapshot = await freezing.freeze(
      actor,
      { whole, figures },
      { letter: issueLetter((before?.sequence ?? 0) + 1), note: request.note },
    );
    const row = await this.keep(actor, snapshot, (before?.sequence ?? 0) + 1);
    if (before) await this.parts.issues.markReplaced(workshopId, before.id);
    await this.parts.drafts.followIssue(whole.estimate, row.letter);
    const values = { letter: row.letter, number: whole.estimate.number };
    await this.parts.audit.record(actor, {
      subject: { kind: 'issue', id: row.id },
      jobId: whole.estimate.jobId,
      code: 'history-issued',
      values,
    });
    await this.parts.jobs.touch(workshopId, whole.estimate.jobId);
    return row;
  }

  /** Marks an issue sent, accepted or declined; the job's state follows, but for a variation, which leaves it where it is. */
  async mark(by: Doer, id: string, mark: IssueMarking): Promise<IssueRow> {
    const { workshopId } = by;
    const issue = await this.parts.issues.lock(workshopId, id);
    const { timeZone } = await this.parts.workshops.get(workshopId);
    const issued = dayOfInstant(issue.issuedAt.getTime(), timeZone);
    mayBeMarked(issue, mark, { issued, today: await this.parts.cards.today(workshopId) });
    if (mark.state === 'accepted') await this.refuseSecond(issue);
    const row = await this.parts.issues.mark(workshopId, id, {
      state: mark.state,
      markedOn: mark.day,
      markNote: mark.note,
    });
    const estimate = await this.parts.estimates.get(workshopId, issue.estimateId);
    if (estimate.kind === 'estimate') await this.parts.jobs.markState(by, estimate.jobId, mark.state);
    else if (mark.state === 'accepted') await this.holdTogether(estimate);
    const deed = markingDeed(issue, estimate.number, mark);
    await this.parts.audit.record(by, { subject: { kind: 'issue', id }, jobId: estimate.jobId, ...deed });
    return row;
  }

  async read(actor: Actor, id: string) {
    const { workshopId } = actor;
    const row = await this.parts.issues.get(workshopId, id);
    const estimate = await this.parts.estimates.get(workshopId, row.estimateId);
    const { jobId, kind, rateCardId } = estimate;
    const snapshot = thawedSnapshot(row);
    const before = await this.parts.issues.newest(workshopId, row.estimateId, row.sequence);
    const [summary] = await this.parts.choices.shown(workshopId, [row]);
    const whole = wholeOfSnapshot(snapshot, { ...row, jobId, kind, rateCardId });
    return {
      summary: { ...summary, choicesFixed: mayChooseNoMore(row, snapshot) },
      differences: before ? lineDifferences(namedLines(thawedSnapshot(before)), namedLines(snapshot)) : [],
      alternatives: [...snapshot.alternatives],
      dates: presentFrozenDates(snapshot),
      estimate: presentEstimate(whole, snapshot.figures, audienceOf(actor.roles)) as CostedEstimate | PricedEstimate,
    };
  }

  /** What the draft changes against the newest issue. */
  async differences(
    workshopId: string,
    estimateId: string,
  ): Promise<{ letter: string | null; lines: LineDifference[] }> {
    const whole = await this.parts.drafts.whole(workshopId, estimateId);
    const newest = await this.parts.issues.newest(workshopId, estimateId);
    if (!newest) return { letter: null, lines: [] };
    const figures = await this.parts.drafts.figures(whole);
    const memberNames = Object.fromEntries(whole.members.map(({ id, content }) => [id, content.name]));
    const after = { lines: figures.price.lines, memberNames };
    return { letter: newest.letter, lines: lineDifferences(namedLines(thawedSnapshot(newest)), after) };
  }

  /** The job is held first: two variations that take the same away are looked at one after the other. */
  private async holdTogether({ workshopId, jobId }: EstimateRow): Promise<void> {
    await this.parts.jobs.touch(workshopId, jobId);
    await this.parts.mustHold(workshopId, jobId);
  }

  /** Of one estimate one issue is agreed on: what changes afterwards is a variation. */
  private async refuseSecond({ workshopId, estimateId }: IssueRow): Promise<void> {
    const others = await this.parts.issues.ofEstimate(workshopId, estimateId);
    if (others.some(({ state }) => state === 'accepted')) throw new Rejection('conflict', 'decision-another-accepted');
  }

  private async keep(actor: Actor, snapshot: Snapshot, sequence: number): Promise<IssueRow> {
    const { workshopId } = actor;
    const { price } = snapshot.figures;
    const row = await this.parts.issues.add(workshopId, {
      id: newId(),
      estimateId: snapshot.estimate.id,
      sequence,
      letter: snapshot.estimate.letter,
      state: 'issued',
      issuedAt: new Date(snapshot.issuedAt),
      issuedBy: snapshot.issuedBy,
      note: snapshot.note,
      validUntil: snapshot.validUntil,
      leafValidUntil: snapshot.leafValidUntil,
      markedOn: null,
      markNote: '',
      netMinor: price.net_minor,
      taxMinor: price.tax_minor,
      grossMinor: price.gross_minor,
      calculatorVersion,
      ...frozenSnapshot(snapshot),
    });
    await this.keepPapers(workshopId, row.id, snapshot);
    return row;
  }

  private async keepPapers(workshopId: string, issueId: string, snapshot: Snapshot): Promise<void> {
    const { logoFileId } = await this.parts.workshops.get(workshopId);
    const logo = logoFileId ? (await this.parts.workshops.logo(workshopId)).bytes : null;
    for (const { paper, name, media, bytes } of await this.parts.papers.issuePapers(snapshot, logo)) {
      const file = await this.parts.files.save(workshopId, { name, media, bytes });
      await this.parts.issues.addPaper(workshopId, { id: newId(), issueId, paper, fileId: file.id });
    }
  }
}
