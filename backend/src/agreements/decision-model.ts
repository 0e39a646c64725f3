import type { Choice } from '#shared/estimates/draft';
import type { TaxedNet } from '#shared/money/tax-by-category';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { WorkshopRow } from '../platform/database/workshop-rows';

/** What a client decided on an issue; never written again. Amounts and taxes are those of the choice. */
export interface DecisionRow extends WorkshopRow {
  readonly issueId: string;
  readonly jobId: string;
  readonly clientId: string;
  readonly accessId: string | null;
  readonly kind: 'accepted' | 'declined';
  readonly typedName: string;
  readonly at: Date;
  readonly address: string;
  readonly choice: Choice;
  readonly reason: string;
  readonly taxes: readonly TaxedNet[];
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly grossMinor: number;
  /** Of the paper that was accepted, which is kept; empty where the issue was declined. */
  readonly pdfSha256: string;
  readonly fileId: string | null;
}

export const decisionTable = (database: Database) =>
  database.table<DecisionRow>('decisions', {
    workshopId: column.workshopId,
    id: column.id,
    issueId: column.reference,
    jobId: column.reference,
    clientId: column.reference,
    accessId: column.reference,
    kind: column.word,
    typedName: column.word,
    at: column.instant,
    address: column.word,
    choice: column.json,
    reason: column.text,
    taxes: column.json,
    netMinor: column.minor,
    taxMinor: column.minor,
    grossMinor: column.minor,
    pdfSha256: { ...column.word, field: 'pdf_sha256' },
    fileId: column.reference,
  });
