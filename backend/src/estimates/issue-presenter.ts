import type { FrozenDates, PricedIssueSummary } from '#shared/estimates/issue-schema';
import type { Snapshot } from '#shared/estimates/snapshot';
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

/** The dates an issue speaks of with what they assume; null where nothing was planned. */
export function presentFrozenDates({ programme }: Snapshot): FrozenDates | null {
  if (!programme) return null;
  const { startsOn, finishesOn, offeredOn, workingDays, assumptions } = programme;
  return { startsOn, finishesOn, offeredOn, workingDays, assumptions: assumptions as FrozenDates['assumptions'] };
}
