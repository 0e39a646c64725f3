import type { Decision } from '#shared/agreements/decision-schema';
import type { DecisionRow } from './decision-model';

export const presentDecision = (row: DecisionRow, alternatives: readonly string[]): Decision => ({
  id: row.id,
  issueId: row.issueId,
  kind: row.kind,
  typedName: row.typedName,
  at: row.at.toISOString(),
  address: row.address,
  choice: [...row.choice],
  alternatives: [...alternatives],
  reason: row.reason,
  net_minor: row.netMinor,
  tax_minor: row.taxMinor,
  gross_minor: row.grossMinor,
  pdfSha256: row.pdfSha256,
});
