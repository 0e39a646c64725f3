import type { HistoryEntry } from '#shared/audit/history-schema';
import { fieldChanges } from '#shared/audit/field-changes';
import type { AuditRow } from './audit-model';

/** More than this is no history any more but a comparison. */
const mostChanges = 40;

/** Things without money in them: what changed of them may be read by everybody who reads the history. */
const withoutMoney: ReadonlySet<string> = new Set(['member', 'piece', 'job', 'client']);

const changesOf = ({ before, after }: AuditRow) =>
  fieldChanges(before, after)
    .slice(0, mostChanges)
    .map((change) => ({ ...change, path: [...change.path] }));

type HistoryLine = Omit<HistoryEntry, 'before' | 'after'>;

export const presentAuditLine = (row: AuditRow): HistoryLine => ({
  id: row.id,
  at: row.at.toISOString(),
  accountId: row.accountId,
  name: row.name,
  subject: { kind: row.subjectKind, id: row.subjectId },
  code: row.code,
  values: row.values,
  changes: withoutMoney.has(row.subjectKind) ? changesOf(row) : [],
});

export const presentAuditEntry = (row: AuditRow): HistoryEntry => ({
  ...presentAuditLine(row),
  changes: changesOf(row),
  before: row.before,
  after: row.after,
});
