import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { InvoiceLine } from '#shared/invoices/invoice-lines';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { beginStageInvoice } from '#shared/invoices/contract-account-endpoints';
import {
  beginCreditNote,
  issueInvoice,
  keepInvoice,
  keepInvoiceSettings,
  readInvoice,
  readInvoiceSettings,
} from '#shared/invoices/invoices-endpoints';
import type { KeptInvoiceSettings } from '#shared/invoices/invoice-settings-schema';
import type { Payment } from '#shared/invoices/payment-schema';
import { recordPayment } from '#shared/invoices/payments-endpoints';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { clientNamed, enterClient } from './sample-job';
import type { Api, TestWorkshop } from './start-api';

async function done<T>(call: PromiseLike<{ status: number; text: string; body: unknown }>): Promise<T> {
  const response = await call;
  if (response.status >= 300) throw new Error(`the sample could not be made: ${response.status} ${response.text}`);
  return response.body as T;
}

/** A line at 20 %, and what of it is different. */
export const sampleLine = (more: Partial<InvoiceLine> = {}): InvoiceLine => ({
  ...{ id: newId(), name: 'Gilding of a frieze', description: '', quantity: '1', unit: 'C62', price: '100.00' },
  ...{ baseQuantity: '1', allowancesCharges: [], tax: { code: 'S', percent: '20' } },
  ...more,
});

export type SampleContent = Invoice['content'];

/** What is entered of an invoice for a client in a workshop's name. */
export const sampleContent = (mark: string, clientId: string, more: Partial<SampleContent> = {}): SampleContent => ({
  ...{ clientId, jobId: null, pricesHold: 'net', allowancesCharges: [], exemptions: [], deliveredOn: null },
  ...{ period: null, dueOn: null, terms: '', roundsToCash: false, note: mark },
  buyer: {
    ...{ name: `${mark} Museum`, contact: '', address: '1 Quay', country: 'AT', vatId: 'ATU12345678' },
    ...{ companyNumber: '', email: 'office@museum.example', reference: '' },
  },
  lines: [sampleLine() as SampleContent['lines'][number]],
  ...more,
});

/** Says who the workshop is on invoices, once. */
export async function sayWho(workshop: TestWorkshop): Promise<void> {
  const { visitor } = workshop.people.owner;
  const { version, ...settings } = await done<KeptInvoiceSettings>(visitor.call(readInvoiceSettings));
  if (version > 0) return;
  const seller = { vatId: 'ATU87654321', taxNumber: '', companyNumber: 'FN 12345' };
  const account = { name: workshop.mark, iban: 'AT611904300234573201', bic: '' };
  await done(visitor.call(keepInvoiceSettings, { version, body: { ...settings, seller, account } }));
}

export interface SampleInvoice {
  readonly clientId: string;
  readonly invoiceId: string;
}

/** A draft over 120.00 with its tax, or whatever is entered instead. */
export async function sampleDraft(workshop: TestWorkshop, more: Partial<SampleContent> = {}): Promise<SampleInvoice> {
  await sayWho(workshop);
  const { visitor } = workshop.people.owner;
  const named = clientNamed(`${workshop.mark} museum ${randomUUID().slice(0, 8)}`, { email: 'office@museum.example' });
  const clientId = more.clientId ?? (await enterClient(visitor, named));
  const invoiceId = newId();
  const body = sampleContent(workshop.mark, clientId, more);
  await done(visitor.call(keepInvoice, { params: { invoiceId }, version: 0, body }));
  return { clientId, invoiceId };
}

/** Issues a draft as it stands. */
export async function issued(workshop: TestWorkshop, invoiceId: string): Promise<Invoice> {
  const { visitor } = workshop.people.owner;
  const { version } = await done<Invoice>(visitor.call(readInvoice, { params: { invoiceId } }));
  return done(visitor.call(issueInvoice, { params: { invoiceId }, body: { version }, key: randomUUID() }));
}

export async function sampleInvoice(workshop: TestWorkshop, more: Partial<SampleContent> = {}): Promise<SampleInvoice> {
  const sample = await sampleDraft(workshop, more);
  await issued(workshop, sample.invoiceId);
  return sample;
}

export const readBack = (workshop: TestWorkshop, invoiceId: string): Promise<Invoice> =>
  done(workshop.people.owner.visitor.call(readInvoice, { params: { invoiceId } }));

/** A draft of a credit note against an issued invoice. */
export async function creditDraft(workshop: TestWorkshop, invoiceId: string): Promise<Invoice> {
  const call = { params: { invoiceId }, body: { creditNoteId: newId() } };
  return done(workshop.people.owner.visitor.call(beginCreditNote, call));
}

/** An invoice of a stage of a contract, issued. */
export async function stageInvoice(
  workshop: TestWorkshop,
  at: { jobId: string; issueId: string },
  claim: StageClaim,
): Promise<Invoice> {
  await sayWho(workshop);
  const body = { invoiceId: newId(), issueId: at.issueId, claim };
  await done(workshop.people.owner.visitor.call(beginStageInvoice, { params: { jobId: at.jobId }, body }));
  return issued(workshop, body.invoiceId);
}

/** What the office enters of a payment for one invoice. */
export async function paymentOf(workshop: TestWorkshop, api: Api, paid: SampleInvoice & { amount_minor: number }) {
  const { clientId, invoiceId, amount_minor } = paid;
  return {
    ...{ clientId, way: 'bank', currency: 'EUR', amount_minor, reference: workshop.mark, surplus: 'refuse' },
    receivedOn: await api.app.rateCards.service.today(workshop.id),
    shares: [{ invoiceId, amount_minor }],
  };
}

export async function samplePayment(workshop: TestWorkshop, api: Api, amount_minor = 12_000): Promise<Payment> {
  const body = await paymentOf(workshop, api, { ...(await sampleInvoice(workshop)), amount_minor });
  return done(workshop.people.owner.visitor.call(recordPayment, { body, key: randomUUID() }));
}
