import type { Actor } from '#shared/actor/actor';
import type { ClientContent } from '#shared/jobs/client-schema';
import { Rejection } from '#shared/problems/rejection';
import type { AuditService } from '../audit';
import type { Clock } from '../platform/clock/clock';
import { failureOf } from '../platform/database/failure';
import { atOf, keepingOf, refuseStale, type Seen } from '../platform/database/keeping';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import type { ClientRow } from './client-model';
import { presentClientContent } from './client-presenter';
import type { ClientRepository } from './client-repository';
import type { JobRepository } from './job-repository';

interface Parts {
  readonly clients: ClientRepository;
  readonly jobs: JobRepository;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** For whom a workshop works. */
export class ClientService {
  constructor(private readonly parts: Parts) {}

  page(workshopId: string, asked: PageAsked & { search: string }): Promise<Page<ClientRow>> {
    return this.parts.clients.pageByName(workshopId, asked);
  }

  get(workshopId: string, id: string): Promise<ClientRow> {
    return this.parts.clients.get(workshopId, id);
  }

  /** Everybody who is kept under an address, in all workshops. */
  withEmail(email: string): Promise<ClientRow[]> {
    return this.parts.clients.byEmail(email);
  }

  /** Enters a client or changes one; what was sent twice is kept once. */
  async keep(actor: Actor, seen: Seen, content: ClientContent): Promise<ClientRow> {
    const row = await this.parts.clients.find(actor.workshopId, seen.id);
    const keeping = keepingOf(row, seen.version, content);
    if (keeping.is === 'entry') return this.enterOnce(actor, seen, content);
    return keeping.is === 'change' ? this.change(actor, keeping.from, content) : keeping.row;
  }

  /** Removes a client for whom there is no job. */
  async remove(actor: Actor, { id, version }: Seen): Promise<void> {
    const { clients, audit } = this.parts;
    const before = await clients.lock(actor.workshopId, id);
    refuseStale(before, version);
    const { name, jobs } = before;
    if (jobs > 0) throw new Rejection('conflict', 'client-has-jobs', { values: { name, jobs } });
    await clients.removeWords(actor.workshopId, id);
    await clients.remove(actor.workshopId, id);
    const subject = { kind: 'client', id };
    await audit.record(actor, {
      subject,
      code: 'history-client-removed',
      values: { name },
      before: presentClientContent(before),
    });
  }

  /** Somebody may enter the same client at this very moment: then it is there by now. */
  private enterOnce(actor: Actor, seen: Seen, content: ClientContent): Promise<ClientRow> {
    return this.enter(actor, seen.id, content).catch((error: unknown) => {
      if (failureOf(error) !== 'taken') throw error;
      return this.keep(actor, seen, content);
    });
  }

  private async enter(actor: Actor, id: string, content: ClientContent): Promise<ClientRow> {
    const { clients, audit, clock } = this.parts;
    const start = { id, jobs: 0, version: 1, createdAt: clock.now() };
    const row = await clients.insert(actor.workshopId, { ...content, ...start });
    await clients.writeWords(actor.workshopId, row);
    const values = { name: content.name };
    await audit.record(actor, {
      subject: { kind: 'client', id },
      code: 'history-client-entered',
      values,
      after: content,
    });
    return row;
  }

  private async change(actor: Actor, before: ClientRow, content: ClientContent): Promise<ClientRow> {
    const { clients, jobs, audit } = this.parts;
    const { workshopId, id, name } = before;
    const after = await clients.change(workshopId, atOf(before), content);
    await clients.writeWords(workshopId, after);
    if (after.name !== name) await jobs.writeWordsOfClient(workshopId, id, after.name);
    const subject = { kind: 'client', id };
    await audit.record(actor, {
      subject,
      code: 'history-client-changed',
      values: { name: after.name },
      before: presentClientContent(before),
      after: content,
    });
    return after;
  }
}
