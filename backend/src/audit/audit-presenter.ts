import type { HistoryEntry } from '#shared/audit/history-schema';
import type { AuditRow } from './audit-model';

type HistoryLine = Omit<HistoryEntry, 'before' | 'after'>;

export const presentLine = (row: AuditRow): HistoryLine => ({
  id: row.id,
  at: row.at.toISOString(),
  accountId: row.accountId,
  name: row.name,
  subject: { kind: row.subjectKind, id: row.subjectId },
  code: row.code,
  values: row.values,
});

export const presentEntry = (row: AuditRow): HistoryEntry => ({
  ...presentLine(row),
  before: row.before,
  after: row.after,
});
