import type { Actor } from '#shared/actor/actor';
import type { JobState, ReachedState } from '#shared/jobs/job-schema';
import type { Doer } from '../audit';
import type { Clock } from '../platform/clock/clock';
import { atOf, refuseStale, type Seen } from '../platform/database/keeping';
import type { JobHistory } from './job-history';
import type { JobRow, NamedJobRow } from './job-model';
import type { JobRepository } from './job-repository';
import type { NamedJobs } from './named-jobs';

interface Parts {
  readonly jobs: JobRepository;
  readonly named: NamedJobs;
  readonly history: JobHistory;
  readonly clock: Clock;
}

/** Where jobs stand. A job is finished and taken up again by hand; everything else follows from its issues. */
export class JobStateService {
  constructor(private readonly parts: Parts) {}

  /** Puts a job away, or takes it up again where its issues have brought it. */
  async finish(actor: Actor, seen: Seen, isFinished: boolean): Promise<NamedJobRow> {
    const { jobs, named, clock } = this.parts;
    const before = await named.lock(actor.workshopId, seen.id);
    const state = isFinished ? 'finished' : before.reached;
    if (before.state === state) return before;
    refuseStale(before, seen.version);
    const after = await jobs.change(actor.workshopId, atOf(before), { state, changedAt: clock.now() });
    await this.tell(actor, before, after);
    return { ...after, clientName: before.clientName };
  }

  /** Writes down where issues have brought a job. A finished one shows it once it is taken up again; the version stays, for nobody's entries change. */
  async mark(by: Doer, jobId: string, reached: ReachedState): Promise<void> {
    const before = await this.parts.jobs.lock(by.workshopId, jobId);
    if (before.reached === reached) return;
    const state: JobState = before.state === 'finished' ? 'finished' : reached;
    const change = { reached, state, changedAt: this.parts.clock.now() };
    await this.parts.jobs.write(by.workshopId, jobId, change);
    await this.tell(by, before, { ...before, ...change });
  }

  /** Somebody worked on the job: it comes first in the list of what changed last. */
  touch(workshopId: string, jobId: string): Promise<void> {
    return this.parts.jobs.write(workshopId, jobId, { changedAt: this.parts.clock.now() });
  }

  private async tell(by: Doer, before: JobRow, after: JobRow): Promise<void> {
    if (before.state === after.state) return;
    const change = { before: { state: before.state }, after: { state: after.state } };
    await this.parts.history.record(by, after, {
      code: 'history-job-state',
      values: { state: after.state },
      ...change,
    });
  }
}
