import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { startInvoiceSettings } from '#shared/invoices/invoice-settings';
import { acceptedIssue } from '../sample-client-visit';
import type { ClientRow, ClientRows, MatrixRows } from '../matrix-row';
import {
  paymentOf,
  sampleContent,
  sampleDraft,
  sampleInvoice,
  samplePayment,
  sayWho,
  stageInvoice,
} from '../sample-invoice';
import { sampleClient } from '../sample-job';
import { onceInWhatStandsStill } from '../standing-still';
import type { Api, TestWorkshop } from '../start-api';

const oneDraft = async (workshop: TestWorkshop) => {
  const { invoiceId } = await sampleDraft(workshop);
  return { params: { invoiceId } };
};
const oneInvoice = onceInWhatStandsStill(async (workshop) => {
  const { invoiceId } = await sampleInvoice(workshop);
  return { params: { invoiceId } };
});
const oneContract = async (workshop: TestWorkshop, api: Api) => {
  await sayWho(workshop);
  const { jobId, issueId } = await acceptedIssue(workshop, api);
  return { jobId, issueId };
};
const claim = { of: 'work', from_percent: '0', to_percent: '25' };
const thisYear = { from: '2020-01-01', to: '2099-12-31' };
const keyed = () => ({ key: randomUUID() });

const settingsVersion = async (workshop: TestWorkshop, api: Api) =>
  (await api.app.invoices.settings.read(workshop.id)).version;

export const invoicesRows: MatrixRows = {
  readInvoiceSettings: { prepare: () => ({}) },
  keepInvoiceSettings: {
    prepare: async (workshop, api) => {
      await sayWho(workshop);
      const seller = { vatId: 'ATU87654321', taxNumber: '', companyNumber: 'FN 12345' };
      const body = { ...startInvoiceSettings({ name: workshop.mark, taxRegistration: '' }), seller };
      return { body, version: await settingsVersion(workshop, api) };
    },
    history: 'history-invoice-settings',
  },
  listInvoices: {
    prepare: async (workshop) => {
      await sampleDraft(workshop);
      return {};
    },
  },
  readInvoice: { prepare: oneDraft },
  keepInvoice: {
    prepare: async (workshop) => {
      const { invoiceId, clientId } = await sampleDraft(workshop);
      return { params: { invoiceId }, version: 1, body: sampleContent(workshop.mark, clientId, { note: 'Changed' }) };
    },
    history: 'history-invoice-changed',
  },
  removeInvoice: {
    prepare: async (workshop) => ({ ...(await oneDraft(workshop)), version: 1 }),
    history: 'history-invoice-removed',
  },
  beginCreditNote: {
    prepare: async (workshop, api) => ({ ...(await oneInvoice(workshop, api)), body: { creditNoteId: newId() } }),
    history: 'history-invoice-begun',
  },
  issueInvoice: {
    prepare: async (workshop) => ({ ...(await oneDraft(workshop)), body: { version: 1 }, ...keyed() }),
    history: 'history-invoice-issued',
  },
  readInvoicePaper: {
    prepare: async (workshop, api) => {
      const { params } = await oneInvoice(workshop, api);
      return { params: { ...params, paper: 'invoice.xml' } };
    },
  },
  sendInvoice: {
    prepare: async (workshop, api) => ({
      ...(await oneInvoice(workshop, api)),
      body: { note: workshop.mark },
      ...keyed(),
    }),
    history: 'history-invoice-sent',
  },
  readContractAccount: {
    prepare: async (workshop, api) => {
      const { jobId } = await oneContract(workshop, api);
      return { params: { jobId } };
    },
  },
  listDueStages: {
    prepare: async (workshop, api) => {
      await oneContract(workshop, api);
      return {};
    },
  },
  beginStageInvoice: {
    prepare: async (workshop, api) => {
      const { jobId, issueId } = await oneContract(workshop, api);
      return { params: { jobId }, body: { invoiceId: newId(), issueId, claim } };
    },
    history: 'history-invoice-begun',
  },
  nameStageDay: {
    prepare: async (workshop, api) => {
      const { jobId, issueId } = await oneContract(workshop, api);
      return { params: { jobId }, body: { issueId, claim, of: 'planned', day: '2027-02-01' } };
    },
    history: 'history-stage-planned',
  },
  listPayments: {
    prepare: async (workshop, api) => {
      await samplePayment(workshop, api);
      return {};
    },
  },
  recordPayment: {
    prepare: async (workshop, api) => ({
      body: await paymentOf(workshop, api, { ...(await sampleInvoice(workshop)), amount_minor: 12_000 }),
      ...keyed(),
    }),
    history: 'history-payment-entered',
    namesRows: true,
  },
  sharePayment: {
    prepare: async (workshop, api) => {
      const first = await sampleInvoice(workshop);
      const entry = {
        ...(await paymentOf(workshop, api, { ...first, amount_minor: 15_000 })),
        surplus: 'keep',
      } as const;
      const shares = [{ invoiceId: first.invoiceId, amount_minor: 12_000 }];
      const owner = workshop.people.owner.actor;
      const record = () => api.app.invoices.recording.record(owner, { ...entry, way: 'bank', shares });
      const { id: paymentId } = await api.platform.database.transaction(record);
      const { invoiceId } = await sampleInvoice(workshop, { clientId: first.clientId });
      return { params: { paymentId }, body: { invoiceId, amount_minor: 3_000 }, ...keyed() };
    },
    history: 'history-payment-shared',
  },
  refundPayment: {
    prepare: async (workshop, api) => {
      const { id: paymentId, receivedOn } = await samplePayment(workshop, api);
      const body = { refundId: newId(), amount_minor: 500, refundedOn: receivedOn, reference: '', reopens: true };
      return { params: { paymentId }, body, ...keyed() };
    },
    history: 'history-refunded',
  },
  writeOff: {
    prepare: async (workshop, api) => ({
      ...(await oneInvoice(workshop, api)),
      body: { amount_minor: 100, reason: workshop.mark },
      ...keyed(),
    }),
    history: 'history-written-off',
  },
  // Whoever is no payment service cannot sign, so a call as the matrix makes it is refused; checkouts.spec.ts has the signed ones.
  takePaymentEvent: { prepare: () => ({ body: { id: 'evt_unsigned' } }), status: 400 },
  listUnknownPaymentEvents: { prepare: () => ({}) },
  readOwed: {
    prepare: async (workshop) => {
      await sampleInvoice(workshop);
      return {};
    },
  },
  readStatement: {
    prepare: async (workshop) => ({ params: { clientId: await sampleClient(workshop) }, query: thisYear }),
  },
  readStatementPaper: {
    prepare: async (workshop) => ({ params: { clientId: await sampleClient(workshop) }, query: thisYear }),
  },
  readJournal: { prepare: () => ({ query: thisYear }) },
  readJournalList: { prepare: () => ({ query: thisYear }) },
  readJournalWorkbook: { prepare: () => ({ query: thisYear }) },
  remindOfInvoice: {
    prepare: async (workshop, api) => ({
      ...(await oneInvoice(workshop, api)),
      body: { note: workshop.mark },
      ...keyed(),
    }),
    // It is due in a fortnight yet; invoices.spec.ts reminds of one that is overdue.
    status: 409,
  },
  sendStatement: {
    prepare: async (workshop) => {
      const params = { clientId: await sampleClient(workshop) };
      return { params, body: { ...thisYear, note: workshop.mark }, ...keyed() };
    },
    history: 'history-statement-sent',
  },
};

/** A client who looks at an invoice of a deposit of their job. */
const clientWithInvoice = onceInWhatStandsStill(async (workshop, api) => {
  const { jobId, issueId, visitor } = await acceptedIssue(workshop, api);
  const invoice = await stageInvoice(workshop, { jobId, issueId }, { of: 'work', from_percent: '0', to_percent: '10' });
  return { visitor, invoiceId: invoice.id };
});

const onInvoice =
  (more: Record<string, string> = {}): ClientRow['visit'] =>
  async (workshop, api) => {
    const { visitor, invoiceId } = await clientWithInvoice(workshop, api);
    return { visitor, parts: { params: { invoiceId, ...more } } };
  };

export const clientInvoicesRows: ClientRows = {
  listClientInvoices: {
    visit: async (workshop, api) => ({ visitor: (await clientWithInvoice(workshop, api)).visitor, parts: {} }),
  },
  readClientInvoicePaper: { visit: onInvoice({ paper: 'invoice.pdf' }) },
  beginClientCheckout: { visit: onInvoice(), history: 'history-checkout-begun' },
  askClientCheckout: {
    visit: async (workshop, api) => {
      const { visitor, invoiceId } = await clientWithInvoice(workshop, api);
      const payer = { accessId: newId(), name: workshop.mark, email: '', returnUrl: () => 'http://127.0.0.1/' };
      const begin = () => api.app.invoices.checkouts.begin(workshop.id, invoiceId, payer);
      const { id: checkoutId } = await api.platform.database.transaction(begin);
      return { visitor, parts: { params: { checkoutId } } };
    },
  },
};
