import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { AccessRequest } from '#shared/agreements/access-schema';
import { addDays } from '#shared/calendar/add-days';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode } from '#shared/words/word-code';
import { newToken, type WorkshopService } from '../accounts';
import type { AuditService } from '../audit';
import type { Estimates, FrozenIssue } from '../estimates';
import type { ClientRow, Jobs, NamedJobRow } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import { words } from '../platform/http/words';
import type { ClientAccessRow } from './client-access-model';
import type { ClientAccessRepository } from './client-access-repository';
import { instantAfterDay } from './instant-after-day';
import type { LetterService } from './letter-service';

interface Parts {
  readonly accesses: ClientAccessRepository;
  readonly estimates: Pick<Estimates, 'frozen' | 'issues'>;
  readonly jobs: Pick<Jobs, 'job' | 'client'>;
  readonly workshops: WorkshopService;
  readonly letters: LetterService;
  readonly audit: AuditService;
  readonly clock: Clock;
  readonly origin: string;
}

/** A way in with its whole link, which is told once. */
export interface GivenAccess {
  readonly access: ClientAccessRow;
  readonly link: string;
}

interface Giving {
  readonly issue: FrozenIssue;
  readonly job: NamedJobRow;
  readonly client: ClientRow;
  readonly request: AccessRequest;
  readonly today: string;
}

const longest_days = 730;

/** Links to the papers of a job: given, listed, taken back. Only the hash of a secret is kept. */
export class AccessService {
  constructor(private readonly parts: Parts) {}

  async give(actor: Actor, issueId: string, request: AccessRequest): Promise<GivenAccess> {
    const giving = await this.giving(actor.workshopId, issueId, request);
    const { job, client } = giving;
    const { timeZone } = await this.parts.workshops.get(actor.workshopId);
    const endsAt = instantAfterDay(request.endsOn, timeZone);
    const { row, link } = await this.add(client, { jobId: job.id, createdBy: actor.name, endsAt, purpose: 'link' });
    await this.tell(actor, row, { code: 'history-access-given', name: client.name });
    if (request.send) await this.send(actor, giving, link);
    return { access: row, link };
  }

  /** A new way in, with the link that leads there: the secret stands in the fragment, which no server and no log ever sees. */
  async add(
    { workshopId, id: clientId }: ClientRow,
    access: Pick<ClientAccessRow, 'jobId' | 'createdBy' | 'endsAt' | 'purpose'>,
  ): Promise<{ row: ClientAccessRow; link: string }> {
    const { token, tokenHash } = newToken();
    const start = { id: newId(), createdAt: this.parts.clock.now(), revokedAt: null, openedAt: null };
    const row = await this.parts.accesses.insert(workshopId, { ...access, ...start, clientId, tokenHash });
    return { row, link: `${this.parts.origin}/client#${token}` };
  }

  async ofJob(workshopId: string, jobId: string): Promise<ClientAccessRow[]> {
    await this.parts.jobs.job(workshopId, jobId);
    return this.parts.accesses.ofJob(workshopId, jobId);
  }

  /** Ends a way in at once; harmless where it has been ended before. */
  async revoke(actor: Actor, accessId: string): Promise<void> {
    const { workshopId } = actor;
    const row = await this.parts.accesses.lock(workshopId, accessId);
    if (row.revokedAt) return;
    await this.parts.accesses.write(workshopId, accessId, { revokedAt: this.parts.clock.now() });
    const { name } = await this.parts.jobs.client(workshopId, row.clientId);
    await this.tell(actor, row, { code: 'history-access-revoked', name });
  }

  private async giving(workshopId: string, issueId: string, request: AccessRequest): Promise<Giving> {
    const issue = await this.parts.estimates.frozen.read(workshopId, issueId);
    const job = await this.parts.jobs.job(workshopId, issue.estimate.jobId);
    const client = await this.parts.jobs.client(workshopId, job.clientId);
    const { timeZone } = await this.parts.workshops.get(workshopId);
    const today = dayOfInstant(this.parts.clock.now().getTime(), timeZone);
    const complain = (code: WordCode) =>
      new Rejection('invalid', 'problem-invalid', { complaints: [{ path: ['endsOn'], code, values: {} }] });
    if (request.endsOn < today) throw complain('access-day-past');
    if (request.endsOn > addDays(today, longest_days)) throw complain('access-day-far');
    if (request.send && client.email === '')
      throw new Rejection('conflict', 'access-no-email', { values: { client: client.name } });
    return { issue, job, client, request, today };
  }

  private async send(actor: Actor, { issue, job, client, request, today }: Giving, link: string): Promise<void> {
    const { row, estimate, snapshot } = issue;
    const number = words('paper-number-letter', { ...snapshot.estimate });
    await this.parts.letters.post(actor.workshopId, {
      kind: estimate.kind,
      client,
      values: ({ total, day }) => ({
        ...{ job: job.title, link, number, note: request.note },
        ...{ total: total(row, estimate.currency), day: day(row.validUntil) },
      }),
    });
    if (row.state === 'issued')
      await this.parts.estimates.issues.mark(actor, row.id, { state: 'sent', day: today, note: '' });
  }

  private tell(actor: Actor, { id, jobId }: ClientAccessRow, deed: { code: WordCode; name: string }): Promise<void> {
    const { code, name } = deed;
    const subject = { kind: 'access', id };
    return this.parts.audit.record(actor, { subject, code, values: { name }, ...(jobId ? { jobId } : {}) });
  }
}
