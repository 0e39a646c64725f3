import { createHash } from 'node:crypto';
import { gunzipSync, gzipSync } from 'node:zlib';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Snapshot } from '#shared/estimates/snapshot';
import { Remembered } from '#shared/units/remembered';
import type { EstimateRow } from './estimate-model';
import type { IssueRow } from './issue-model';
import { upgradedSnapshot } from './upgraded-snapshot';
import type { WholeEstimate } from './whole-estimate';

/** A snapshot as it is kept: gzipped canonical JSON and the SHA-256 of that JSON. */
export function frozenSnapshot(snapshot: Snapshot): Pick<IssueRow, 'snapshot' | 'sha256'> {
  const json = canonicalJson(snapshot);
  return { snapshot: gzipSync(json), sha256: createHash('sha256').update(json).digest('hex') };
}

/** Reads a kept snapshot; throws when the bytes are not those that were frozen. */
export function thawedSnapshot(row: Pick<IssueRow, 'snapshot' | 'sha256' | 'id'>): Snapshot {
  const json = gunzipSync(row.snapshot);
  const found = createHash('sha256').update(json).digest('hex');
  if (found !== row.sha256) throw new Error(`issue ${row.id} is not what was frozen`);
  return upgradedSnapshot(JSON.parse(json.toString('utf8')) as Snapshot);
}

/** Titles by the hash of what was frozen, which never changes: lists of many issues need nothing else of them. */
const titles = new Remembered<string>(20_000);

/** What an issue was called when it was issued. */
export const titleOfIssue = (row: Pick<IssueRow, 'snapshot' | 'sha256' | 'id'>): string =>
  titles.of(row.sha256, () => thawedSnapshot(row).draft.settings.title);

/** A frozen estimate put as the tables would hold it, so that one presenter serves drafts and issues. */
export function wholeOfSnapshot(
  { draft, estimate, workshop, issuedAt }: Snapshot,
  row: IssueRow & Pick<EstimateRow, 'jobId' | 'kind' | 'rateCardId'>,
): WholeEstimate {
  const { workshopId, jobId, kind, rateCardId } = row;
  const common = { workshopId, estimateId: estimate.id, version: 1 };
  return {
    estimate: {
      ...{ workshopId, id: estimate.id, jobId, kind, number: estimate.number, version: 1, rateCardId },
      currency: workshop.currency,
      settings: draft.settings,
      settingsVersion: 1,
      members: draft.members.length,
      letter: estimate.letter,
      changedAt: new Date(issuedAt),
    },
    pieces: draft.pieces.map(({ id, ...content }) => ({ ...common, id, content })),
    members: draft.members.map(({ id, ...content }) => ({ ...common, id, content, pieceId: content.pieceId })),
  };
}
