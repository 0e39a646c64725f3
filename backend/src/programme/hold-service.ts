import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import type { ProgrammeParts, ProgrammeService } from './programme-service';

interface Parts extends Pick<ProgrammeParts, 'programmes' | 'contexts' | 'estimates' | 'clock'> {
  readonly service: ProgrammeService;
}

/** Slots held for offers that were sent. Nothing has to end them: past its last day a hold counts no more. */
export class HoldService {
  constructor(private readonly parts: Parts) {}

  /** Holds the planned slot for the newest issue, until its validity ends; the same again changes nothing. */
  async hold(actor: Actor, estimateId: string): Promise<ProgrammeAnswer> {
    const { workshopId } = actor;
    const { programmes, contexts, estimates, service, clock } = this.parts;
    const row = await service.lock(workshopId, estimateId);
    const context = await contexts.of(workshopId, estimateId);
    const [issue] = await estimates.issues.ofEstimate(workshopId, estimateId);
    if (!issue || issue.state !== 'sent') throw new Rejection('conflict', 'programme-hold-not-sent');
    const values = { letter: issue.letter, until: issue.validUntil };
    if (issue.validUntil < context.today) throw new Rejection('conflict', 'programme-hold-over', { values });
    if (!row.kept) throw new Rejection('conflict', 'programme-no-plan');
    const isHeld = row.holdIssueId === issue.id && row.holdUntil === issue.validUntil;
    if (isHeld) return service.read(workshopId, estimateId);
    const change = { holdIssueId: issue.id, holdUntil: issue.validUntil, changedAt: clock.now() };
    await programmes.change(workshopId, { id: estimateId, version: row.version }, change);
    const { number } = context.whole.estimate;
    await service.record(actor, context, { code: 'history-slot-held', values: { number, ...values } });
    return service.read(workshopId, estimateId);
  }

  /** Gives a slot up; where none is held nothing changes. */
  async release(actor: Actor, estimateId: string): Promise<ProgrammeAnswer> {
    const { workshopId } = actor;
    const { programmes, contexts, service, clock } = this.parts;
    const row = await programmes.hold(workshopId, estimateId);
    if (row?.holdUntil) {
      const change = { holdIssueId: null, holdUntil: null, changedAt: clock.now() };
      await programmes.change(workshopId, { id: estimateId, version: row.version }, change);
      const context = await contexts.of(workshopId, estimateId);
      const { number } = context.whole.estimate;
      await service.record(actor, context, { code: 'history-slot-released', values: { number } });
    }
    return service.read(workshopId, estimateId);
  }
}
