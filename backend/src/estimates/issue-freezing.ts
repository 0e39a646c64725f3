import type { Actor } from '#shared/actor/actor';
import type { Snapshot, SnapshotVaried } from '#shared/estimates/snapshot';
import { jobNumber, type NamedJobRow } from '../jobs';
import type { EstimateRow } from './estimate-model';
import { thawedSnapshot } from './frozen-snapshot';
import type { IssueParts } from './issue-parts';
import { snapshotOf } from './snapshot-of';
import type { WholeEstimate } from './whole-estimate';

/** Puts together what an issue freezes: the draft as it is worked, whom it is for, and what stands over its papers. */
export class IssueFreezing {
  constructor(private readonly parts: IssueParts) {}

  async freeze(
    actor: Actor,
    worked: { whole: WholeEstimate; figures: Snapshot['figures'] },
    paper: { letter: string; note: string },
  ): Promise<Snapshot> {
    const { workshopId } = actor;
    const { estimate } = worked.whole;
    const job = await this.job(workshopId, estimate.jobId);
    const client = await this.parts.jobs.client(workshopId, job.clientId);
    return snapshotOf({
      ...worked,
      ...paper,
      alternatives: await this.parts.drafts.alternatives(worked.whole),
      card: await this.parts.cards.get(workshopId, estimate.rateCardId),
      workshop: await this.parts.workshops.get(workshopId),
      client: { name: client.name, contact: client.contact, address: client.address },
      job: { number: job.number, title: job.title, reference: job.reference, site: job.site },
      now: this.parts.clock.now(),
      today: await this.parts.cards.today(workshopId),
      issuedBy: actor.name,
      programme: await this.parts.programme(workshopId, estimate.id),
      varies: estimate.kind === 'variation' ? await this.varied(estimate) : null,
    });
  }

  private async job(workshopId: string, jobId: string): Promise<NamedJobRow & { number: string }> {
    const row = await this.parts.jobs.job(workshopId, jobId);
    return { ...row, number: jobNumber(row) };
  }

  /** What was accepted of the job's estimates, as their issues are called. */
  private async varied({ workshopId, jobId }: EstimateRow): Promise<SnapshotVaried[]> {
    const all = await this.parts.estimates.ofJob(workshopId, jobId);
    const firsts = new Map(all.filter(({ kind }) => kind === 'estimate').map(({ id, number }) => [id, number]));
    const rows = await this.parts.issues.ofEstimates(workshopId, [...firsts.keys()]);
    return rows
      .filter(({ state }) => state === 'accepted')
      .map((row) => {
        const { draft, job } = thawedSnapshot(row);
        const title = draft.settings.title.trim() || job.title;
        return { number: firsts.get(row.estimateId) ?? '', letter: row.letter, title };
      });
  }
}
