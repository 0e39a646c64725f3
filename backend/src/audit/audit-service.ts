import { v7 as newId } from 'uuid';
import type { WordCode, WordValues } from '#shared/words/word-code';
import type { Clock } from '../platform/clock/clock';
import { isInTransaction } from '../platform/database/is-in-transaction';
import type { Page, PageAsked } from '../platform/database/workshop-rows';
import type { AuditRow } from './audit-model';
import type { AuditRepository } from './audit-repository';

/** Whose doing it was: an actor, or the workshop itself where no hand was in it. */
export interface Doer {
  readonly workshopId: string;
  readonly accountId: string | null;
  readonly name: string;
}

/** What was done: to which thing, in words, and what it was before and after (plain JSON). */
export interface Deed {
  readonly subject: { readonly kind: string; readonly id: string };
  readonly jobId?: string;
  readonly code: WordCode;
  readonly values?: WordValues;
  readonly before?: unknown;
  readonly after?: unknown;
  /** One person's deeds of this kind on one thing within ten minutes, with nothing in between, are one entry. */
  readonly merges?: boolean;
}

const merging_milliseconds = 10 * 60_000;

export class AuditService {
  constructor(
    private readonly entries: AuditRepository,
    private readonly clock: Clock,
  ) {}

  /** Writes history in the transaction of what it tells of, so that neither exists without the other. */
  async record(by: Doer, deed: Deed): Promise<void> {
    if (!isInTransaction()) throw new Error('history is written in the transaction of what it tells of');
    const earlier = deed.merges ? await this.toMergeWith(by, deed) : undefined;
    if (earlier)
      return this.entries.write(by.workshopId, earlier.id, { values: deed.values ?? {}, after: deed.after ?? null });
    await this.entries.insert(by.workshopId, {
      id: newId(),
      at: this.clock.now(),
      accountId: by.accountId,
      name: by.name,
      subjectKind: deed.subject.kind,
      subjectId: deed.subject.id,
      jobId: deed.jobId ?? null,
      code: deed.code,
      values: deed.values ?? {},
      before: deed.before ?? null,
      after: deed.after ?? null,
    });
  }

  page(workshopId: string, asked: PageAsked & { jobId?: string | undefined }): Promise<Page<AuditRow>> {
    return this.entries.pageOf(workshopId, asked);
  }

  private async toMergeWith(by: Doer, deed: Deed): Promise<AuditRow | undefined> {
    const newest = await this.entries.newestAbout(by.workshopId, deed.subject.id);
    if (!newest || newest.code !== deed.code || newest.accountId !== by.accountId) return undefined;
    return this.clock.now().getTime() - newest.at.getTime() < merging_milliseconds ? newest : undefined;
  }
}
