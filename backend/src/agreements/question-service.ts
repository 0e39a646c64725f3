import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { ClientActor } from '#shared/actor/client-actor';
import { Rejection } from '#shared/problems/rejection';
import type { AuditService, Doer } from '../audit';
import type { FrozenIssue, FrozenIssueService } from '../estimates';
import type { Jobs, NamedJobRow } from '../jobs';
import type { Clock } from '../platform/clock/clock';
import { words } from '../platform/http/words';
import type { ClientScope } from './client-scope';
import type { LetterService } from './letter-service';
import type { QuestionRow } from './question-model';
import type { QuestionRepository } from './question-repository';

interface Parts {
  readonly questions: QuestionRepository;
  readonly scope: ClientScope;
  readonly frozen: FrozenIssueService;
  readonly jobs: Pick<Jobs, 'job' | 'client'>;
  readonly letters: LetterService;
  readonly audit: AuditService;
  readonly clock: Clock;
  readonly origin: string;
}

type Author = Pick<QuestionRow, 'author' | 'name' | 'accountId'>;

/** What clients ask about issues, and what they are answered: kept as a thread of the job, and mailed both ways. */
export class QuestionService {
  constructor(private readonly parts: Parts) {}

  async ofJob(workshopId: string, jobId: string): Promise<QuestionRow[]> {
    await this.parts.jobs.job(workshopId, jobId);
    return this.parts.questions.ofJob(workshopId, jobId);
  }

  async ask(client: ClientActor, issueId: string, text: string): Promise<QuestionRow> {
    const { job, ...issue } = await this.parts.scope.issue(client, issueId);
    const row = await this.keep(issue, { author: 'client', name: client.name, accountId: null }, text);
    const by = { workshopId: client.workshopId, accountId: null, name: client.name };
    const number = await this.tell(by, issue, { code: 'history-question-asked', name: client.name });
    const link = `${this.parts.origin}/jobs/${job.id}`;
    await this.parts.letters.notify(client.workshopId, {
      kind: 'question',
      values: () => ({ client: client.name, number, job: job.title, text, link }),
      ...(client.email === '' ? {} : { replyTo: client.email }),
    });
    return row;
  }

  async answer(
    actor: Actor,
    jobId: string,
    { issueId, text }: { issueId: string; text: string },
  ): Promise<QuestionRow> {
    const { workshopId } = actor;
    const job = await this.parts.jobs.job(workshopId, jobId);
    const issue = await this.parts.frozen.read(workshopId, issueId);
    if (issue.estimate.jobId !== jobId) throw new Rejection('not-found', 'problem-not-found');
    const row = await this.keep(issue, { author: 'workshop', name: actor.name, accountId: actor.accountId }, text);
    await this.tell(actor, issue, { code: 'history-question-answered', name: job.clientName });
    await this.write(job, text);
    return row;
  }

  private async write({ workshopId, clientId, title }: NamedJobRow, text: string): Promise<void> {
    const client = await this.parts.jobs.client(workshopId, clientId);
    const link = `${this.parts.origin}/client`;
    await this.parts.letters.post(workshopId, { kind: 'answer', client, values: () => ({ job: title, link, text }) });
  }

  private keep({ row, estimate }: FrozenIssue, author: Author, text: string): Promise<QuestionRow> {
    const at = { id: newId(), jobId: estimate.jobId, issueId: row.id, at: this.parts.clock.now() };
    return this.parts.questions.insert(row.workshopId, { ...at, ...author, text });
  }

  private async tell(
    by: Doer,
    { row, estimate }: FrozenIssue,
    deed: { code: 'history-question-asked' | 'history-question-answered'; name: string },
  ): Promise<string> {
    const { number } = estimate;
    const values = { name: deed.name, letter: row.letter, number };
    const subject = { kind: 'issue', id: row.id };
    await this.parts.audit.record(by, { subject, jobId: estimate.jobId, code: deed.code, values });
    return words('paper-number-letter', { number, letter: row.letter });
  }
}
