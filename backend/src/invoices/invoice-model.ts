import type { InvoiceContent, InvoiceKind } from '#shared/invoices/invoice';
import type { InvoiceState } from '#shared/invoices/invoice-schema';
import type { InvoiceSettings } from '#shared/invoices/invoice-settings';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow, WorkshopRow } from '../platform/database/workshop-rows';

/** What is known of an invoice only once it was issued. */
export interface IssuedPart {
  readonly number: string | null;
  readonly series: string | null;
  readonly year: number | null;
  readonly ordinal: number | null;
  readonly issuedOn: string | null;
  readonly issuedAt: Date | null;
  readonly issuedBy: string | null;
  readonly dueOn: string | null;
  /** Canonical JSON, gzipped, and the SHA-256 of the JSON. */
  readonly snapshot: Buffer | null;
  readonly sha256: string | null;
  readonly pdfFileId: string | null;
  readonly xmlFileId: string | null;
}

/** An invoice or credit note; from when it is issued only what is open and credited of it is ever written again. */
export interface InvoiceRow extends VersionedRow, IssuedPart {
  readonly kind: InvoiceKind;
  readonly state: InvoiceState;
  readonly clientId: string;
  readonly jobId: string | null;
  readonly creditedInvoiceId: string | null;
  readonly claimIssueId: string | null;
  readonly claim: StageClaim | null;
  readonly currency: string;
  readonly content: InvoiceContent;
  readonly roundingMinor: number;
  readonly netMinor: number;
  readonly taxMinor: number;
  readonly grossMinor: number;
  readonly dueMinor: number;
  readonly openMinor: number;
  readonly creditedMinor: number;
}

/** How a workshop invoices: one row, under the workshop's own id; null content follows the start values. */
export interface InvoiceSettingsRow extends VersionedRow {
  readonly content: InvoiceSettings | null;
}

/** The day a stage is planned for, and the one it was reached on; one of them at least. */
export interface StageDayRow extends WorkshopRow {
  readonly issueId: string;
  readonly claimKey: string;
  readonly plannedOn: string | null;
  readonly reachedOn: string | null;
}

const issuedColumns = {
  number: column.word,
  series: column.word,
  year: column.whole,
  ordinal: column.whole,
  issuedOn: column.day,
  issuedAt: column.instant,
  issuedBy: column.word,
  dueOn: column.day,
  snapshot: column.bytes,
  sha256: column.word,
  pdfFileId: column.reference,
  xmlFileId: column.reference,
};

export const invoiceTable = (database: Database) =>
  database.table<InvoiceRow>('invoices', {
    workshopId: column.workshopId,
    id: column.id,
    version: column.whole,
    kind: column.word,
    state: column.word,
    clientId: column.reference,
    jobId: column.reference,
    creditedInvoiceId: column.reference,
    claimIssueId: column.reference,
    claim: column.json,
    currency: column.word,
    content: column.json,
    roundingMinor: column.minor,
    netMinor: column.minor,
    taxMinor: column.minor,
    grossMinor: column.minor,
    dueMinor: column.minor,
    openMinor: column.minor,
    creditedMinor: column.minor,
    ...issuedColumns,
  });

export const invoiceSettingsTable = (database: Database) =>
  database.table<InvoiceSettingsRow>('invoice_settings', {
    workshopId: column.workshopId,
    id: column.id,
    version: column.whole,
    content: column.json,
  });

export const stageDayTable = (database: Database) =>
  database.table<StageDayRow>('stage_days', {
    workshopId: column.workshopId,
    id: column.id,
    issueId: column.reference,
    claimKey: column.word,
    plannedOn: column.day,
    reachedOn: column.day,
  });
