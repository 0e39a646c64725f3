import type { ClientActor } from '#shared/actor/client-actor';
import type { Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import type { Visit, Visits } from '../platform/session/session-control';
import type { ClientAccessRepository } from './client-access-repository';

interface Parts {
  readonly accesses: ClientAccessRepository;
  readonly jobs: Jobs;
  readonly clock: Clock;
}

/** Whom a visit speaks for. Asked at every request, so that an access that was taken back ends at once. */
export class VisitService implements Visits {
  constructor(private readonly parts: Parts) {}

  async load({ workshopId, accessId }: Visit): Promise<ClientActor | undefined> {
    const access = await this.parts.accesses.holding(workshopId, accessId, this.parts.clock.now());
    if (!access) return undefined;
    const { name, email } = await this.parts.jobs.client(workshopId, access.clientId);
    return { accessId, workshopId, clientId: access.clientId, jobId: access.jobId, name, email };
  }
}
