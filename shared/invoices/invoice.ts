import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import type { DocumentAllowanceOrCharge, InvoiceLine } from '#shared/invoices/invoice-lines';
import type { InvoiceTotals } from '#shared/invoices/invoice-totals';
import type { MinorUnits } from '#shared/money/decimal';
import type { TaxCode } from '#shared/money/tax-codes';

/** A corrective paper is always a credit note: an issued invoice is never changed. */
export const invoiceKinds = ['invoice', 'credit-note'] as const;
export type InvoiceKind = (typeof invoiceKinds)[number];

/** Whom an invoice is for, as it stands on the paper; taken from the client and changed where the paper needs it. */
export interface InvoiceBuyer {
  readonly name: string;
  readonly contact: string;
  readonly address: string;
  /** ISO 3166-1. */
  readonly country: string;
  readonly vatId: string;
  readonly companyNumber: string;
  readonly email: string;
  /** What the buyer asks to be named, such as a number of their order (BT-10). */
  readonly reference: string;
}

/** Why a category charges no tax: a VATEX code, words, or both (EN 16931, BR-E-10 and its like). */
export interface Exemption {
  readonly code: TaxCode;
  readonly reasonCode: string;
  readonly reason: string;
}

/** What a person enters of an invoice or credit note while it is a draft. Days are the workshop's own. */
export interface InvoiceContent {
  readonly clientId: string;
  readonly jobId: string | null;
  readonly buyer: InvoiceBuyer;
  /** Whether prices were entered without tax or with it. */
  readonly pricesHold: 'net' | 'gross';
  readonly lines: readonly InvoiceLine[];
  readonly allowancesCharges: readonly DocumentAllowanceOrCharge[];
  readonly exemptions: readonly Exemption[];
  readonly deliveredOn: string | null;
  readonly period: { readonly from: string; readonly to: string } | null;
  /** Null lets it follow the workshop's own number of days. */
  readonly dueOn: string | null;
  readonly terms: string;
  readonly roundsToCash: boolean;
  readonly note: string;
}

/** Who sends invoices, beyond what stands on the letterhead; one of the three numbers identifies them (BR-CO-26). */
export interface InvoiceSeller {
  /** With the letters of its country in front (BT-31, BR-CO-09). */
  readonly vatId: string;
  /** The number the tax office of the place gave (BT-32). */
  readonly taxNumber: string;
  /** Of the register of companies (BT-30). */
  readonly companyNumber: string;
}

/** Where a transfer goes (BT-84, BT-85, BT-86). */
export interface PayeeAccount {
  readonly name: string;
  readonly iban: string;
  readonly bic: string;
}

/** What an issued invoice freezes: everything on its papers, so that these can be made again from nothing else. */
export interface FrozenInvoice {
  readonly snapshotVersion: 1;
  readonly kind: InvoiceKind;
  readonly number: string;
  /** Instant in UTC (ISO 8601), and its day in the workshop's zone. */
  readonly issuedAt: string;
  readonly issuedOn: string;
  readonly issuedBy: string;
  readonly dueOn: string | null;
  readonly terms: string;
  readonly currency: string;
  readonly workshop: SnapshotWorkshop;
  readonly seller: InvoiceSeller;
  readonly buyer: InvoiceBuyer;
  readonly account: PayeeAccount | null;
  /** A payment in advance of the work (UNTDID 1001: 386). */
  readonly isDeposit: boolean;
  /** The invoice a credit note corrects (BT-25, BT-26). */
  readonly credits: { readonly number: string; readonly issuedOn: string } | null;
  readonly job: { readonly number: string; readonly title: string; readonly reference: string } | null;
  readonly deliveredOn: string | null;
  readonly period: { readonly from: string; readonly to: string } | null;
  readonly lines: readonly InvoiceLine[];
  readonly allowancesCharges: readonly DocumentAllowanceOrCharge[];
  readonly exemptions: readonly Exemption[];
  readonly prepaid_minor: MinorUnits;
  readonly rounding_minor: MinorUnits;
  readonly totals: InvoiceTotals;
  readonly note: string;
  readonly closing: string;
}
