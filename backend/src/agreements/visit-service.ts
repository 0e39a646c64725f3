import type { ClientActor } from '#shared/actor/client-actor';
import { hashOfToken } from '../accounts';
import type { AuditService } from '../audit';
import type { Jobs } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import type { Visit, Visits } from '../platform/session/session-control';
import type { ClientAccessRepository } from './client-access-repository';

interface Parts {
  readonly accesses: ClientAccessRepository;
  readonly jobs: Pick<Jobs, 'client'>;
  readonly audit: AuditService;
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

  /** What a secret opens, written down in the history of the job; nothing where it opens nothing, or nothing any more. */
  async open(token: string): Promise<Visit | undefined> {
    const known = await this.parts.accesses.byTokenHash(hashOfToken(token));
    if (!known) return undefined;
    const visit = { workshopId: known.workshopId, accessId: known.id };
    const client = await this.load(visit);
    if (!client) return undefined;
    const { workshopId, id, jobId } = known;
    if (!known.openedAt) await this.parts.accesses.write(workshopId, id, { openedAt: this.parts.clock.now() });
    const by = { workshopId, accountId: null, name: client.name };
    const deed = { subject: { kind: 'access', id }, code: 'history-access-opened', merges: true } as const;
    await this.parts.audit.record(by, { ...deed, values: { name: client.name }, ...(jobId ? { jobId } : {}) });
    return visit;
  }
}
