import type { ClientActor } from '#shared/actor/client-actor';
import type { ClientInvoiceSummary } from '#shared/client-page/client-overview-schema';

/** The port through which the page learns what a client owes; `invoices` supplies it. */
export interface ClientInvoices {
  /** Invoices and credit notes of the client (of one job, where the visit is to one), the newest first. */
  readonly of: (client: ClientActor) => Promise<readonly ClientInvoiceSummary[]>;
}

/** Where no invoices are written at all. */
export const noInvoices: ClientInvoices = { of: () => Promise.resolve([]) };
