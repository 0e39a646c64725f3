import type { Paper } from '#shared/estimates/issue-schema';
import type { IssueState } from '#shared/estimates/issue-state';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** One frozen copy of an estimate; only its state with the client is ever written again. */
export interface IssueRow extends WorkshopRow {
  readonly estimateId: string;
  readonly sequence: number;
  readonly letter: string;
  readonly state: IssueState;
  readonly issuedAt: Date;
  readonly issuedBy: string;
  readonly note: string;
  readonly validUntil: string;
  readonly leafValidUntil: string;
  readonly markedOn: string | null;
  readonly markNote: string;
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly grossMinor: number;
  readonly calculatorVersion: number;
  /** Canonical JSON, gzipped, and the SHA-256 of the JSON. */
  readonly snapshot: Buffer;
  readonly sha256: string;
}

/** Which kept file a paper of an issue is. */
export interface IssuePaperRow extends WorkshopRow {
  readonly issueId: string;
  readonly paper: Paper;
  readonly fileId: string;
}

export const issueTable = (database: Database) =>
  database.table<IssueRow>('issues', {
    workshopId: column.workshopId,
    id: column.id,
    estimateId: column.reference,
    sequence: column.whole,
    letter: column.word,
    state: column.word,
    issuedAt: column.instant,
    issuedBy: column.word,
    note: column.text,
    validUntil: column.day,
    leafValidUntil: column.day,
    markedOn: column.day,
    markNote: column.text,
    netMinor: column.minor,
    taxMinor: column.minor,
    grossMinor: column.minor,
    calculatorVersion: column.whole,
    snapshot: column.bytes,
    sha256: column.word,
  });

export const issuePaperTable = (database: Database) =>
  database.table<IssuePaperRow>('issue_papers', {
    workshopId: column.workshopId,
    id: column.id,
    issueId: column.reference,
    paper: column.word,
    fileId: column.reference,
  });
