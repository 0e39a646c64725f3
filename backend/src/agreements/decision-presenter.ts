import type { Decision } from '#shared/agreements/decision-schema';
import type { NamedDecision } from './named-decisions';

export const presentDecision = ({ row, number, names }: NamedDecision): Decision => ({
  id: row.id,
  issueId: row.issueId,
  number,
  kind: row.kind,
  typedName: row.typedName,
  at: row.at.toISOString(),
  address: row.address,
  choice: [...row.choice],
  alternatives: [...names],
  reason: row.reason,
  net_minor: row.netMinor,
  tax_minor: row.taxMinor,
  gross_minor: row.grossMinor,
  pdfSha256: row.pdfSha256,
});
