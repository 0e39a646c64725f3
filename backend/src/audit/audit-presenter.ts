import type { HistoryEntry } from '#shared/audit/history-schema';
import type { AuditRow } from './audit-model';

type HistoryLine = Omit<HistoryEntry, 'before' | 'after'>;

export const presentAuditLine = (row: AuditRow): HistoryLine => ({
  id: row.id,
  at: row.at.toISOString(),
  accountId: row.accountId,
  name: row.name,
  subject: { kind: row.subjectKind, id: row.subjectId },
  code: row.code,
  values: row.values,
});

export const presentAuditEntry = (row: AuditRow): HistoryEntry => ({
  ...presentAuditLine(row),
  before: row.before,
  after: row.after,
});
