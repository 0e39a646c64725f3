import {
  readJournal,
  readJournalList,
  readJournalWorkbook,
  readOwed,
  readStatement,
  readStatementPaper,
  remindOfInvoice,
  sendStatement,
} from '#shared/invoices/owed-endpoints';
import {
  listPayments,
  listUnknownPaymentEvents,
  recordPayment,
  refundPayment,
  sharePayment,
  takePaymentEvent,
  writeOff,
} from '#shared/invoices/payments-endpoints';
import { FileAnswer } from '../platform/http/answer';
import { mount, type Route } from '../platform/http/mount';
import type { CheckoutService } from './checkout-service';
import type { InvoiceLetters } from './invoice-letters';
import type { InvoiceReading } from './invoice-reading';
import type { LedgerPapers } from './ledger-papers';
import type { LedgerService } from './ledger-service';
import type { PaymentService } from './payment-service';
import type { RefundService } from './refund-service';
import type { StatementLetters } from './statement-letters';

interface Parts {
  readonly recording: PaymentService;
  readonly refunds: RefundService;
  readonly checkouts: CheckoutService;
  readonly ledger: LedgerService;
  readonly papers: LedgerPapers;
  readonly reading: InvoiceReading;
  readonly letters: InvoiceLetters;
  readonly statementLetters: StatementLetters;
}

const owedRoutes = ({ ledger, papers, letters, statementLetters }: Parts): Route[] => [
  mount(readOwed, ({ actor }) => ledger.owed(actor.workshopId)),
  mount(readStatement, ({ actor, params, query }) => ledger.statement(actor.workshopId, params.clientId, query)),
  mount(readStatementPaper, async ({ actor, params, query }) => {
    const paper = await papers.statement(actor.workshopId, params.clientId, query);
    return new FileAnswer(paper.bytes, paper);
  }),
  mount(readJournal, ({ actor, query }) => ledger.journal(actor.workshopId, query)),
  mount(readJournalList, ({ actor, query }) => papers.journal(actor.workshopId, 'journal.csv', query)),
  mount(readJournalWorkbook, ({ actor, query }) => papers.journal(actor.workshopId, 'journal.xlsx', query)),
  mount(remindOfInvoice, ({ actor, params, body }) => letters.remind(actor, params.invoiceId, body.note)),
  mount(sendStatement, ({ actor, params, body }) => statementLetters.send(actor, params.clientId, body)),
];

export const paymentRoutes = (parts: Parts): Route[] => {
  const { recording, refunds, checkouts, reading } = parts;
  return [
    mount(listPayments, ({ actor, query }) => reading.payments(actor.workshopId, query)),
    mount(recordPayment, async ({ actor, body }) => reading.payment(await recording.record(actor, body))),
    mount(sharePayment, async ({ actor, params, body }) =>
      reading.payment(await recording.share(actor, params.paymentId, body)),
    ),
    mount(refundPayment, async ({ actor, params, body }) =>
      reading.payment(await refunds.refund(actor, params.paymentId, body)),
    ),
    mount(writeOff, async ({ actor, params, body }) =>
      reading.read(await recording.writeOff(actor, params.invoiceId, body)),
    ),
    mount(listUnknownPaymentEvents, async () => ({ items: await checkouts.unknownEvents() })),
    mount(takePaymentEvent, async ({ signed }) => {
      if (signed) await checkouts.take(signed);
    }),
    ...owedRoutes(parts),
  ];
};
