import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import type { IssueRow } from './issue-model';

export const presentIssue = (row: IssueRow): PricedIssueSummary => ({
  id: row.id,
  estimateId: row.estimateId,
  letter: row.letter,
  state: row.state,
  issuedAt: row.issuedAt.toISOString(),
  issuedBy: row.issuedBy,
  note: row.note,
  validUntil: row.validUntil,
  leafValidUntil: row.leafValidUntil,
  markedOn: row.markedOn,
  markNote: row.markNote,
  sha256: row.sha256,
  net_minor: row.netMinor,
  tax_minor: row.taxMinor,
  gross_minor: row.grossMinor,
});
