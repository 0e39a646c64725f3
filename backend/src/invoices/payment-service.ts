import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { PaymentEntry } from '#shared/invoices/payment-schema';
import type { Share } from '#shared/invoices/payment-shares';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import type { Complaint } from '#shared/problems/complaint';
import { Rejection } from '#shared/problems/rejection';
import type { InvoiceRow } from './invoice-model';
import { todayIn, type InvoiceParts } from './invoice-parts';
import { mustBeIssuedInvoice } from './invoice-policy';
import type { PaymentRow } from './payment-model';
import type { SettlingService } from './settling-service';

interface Parts extends InvoiceParts {
  readonly settling: SettlingService;
}

type RecordedField = 'id' | 'workshopId' | 'recordedAt' | 'recordedBy' | 'deed' | 'follows';

const refuse = (path: Complaint['path'], code: Complaint['code'], values: Complaint['values'] = {}): never => {
  throw new Rejection('invalid', 'problem-invalid', { complaints: [{ path, code, values }] });
};

/** Payments by bank and in cash, what of them is for which invoice, and what was given up. */
export class PaymentService {
  constructor(private readonly parts: Parts) {}

  /** Enters a payment; everybody who moves money of a workshop waits for whoever does so already. */
  async record(actor: Actor, entry: PaymentEntry): Promise<PaymentRow> {
    const { workshopId } = actor;
    await this.parts.settings.hold(workshopId);
    const client = await this.parts.jobs.client(workshopId, entry.clientId);
    await this.mustFit(workshopId, entry);
    const payment = await this.add(actor, {
      ...{ clientId: entry.clientId, way: entry.way, currency: entry.currency, amountMinor: entry.amount_minor },
      ...{ receivedOn: entry.receivedOn, reference: entry.reference, refundsPaymentId: null, externalId: null },
      creditMinor: entry.amount_minor,
    });
    await this.parts.settling.share(payment, entry.shares);
    await this.parts.audit.record(actor, {
      subject: { kind: 'payment', id: payment.id },
      code: 'history-payment-entered',
      values: { amount_minor: entry.amount_minor, client: client.name },
    });
    return this.parts.payments.get(workshopId, payment.id);
  }

  /** Puts what lies to a client's credit to one of their invoices. */
  async share(actor: Actor, paymentId: string, share: Share): Promise<PaymentRow> {
    const { workshopId } = actor;
    await this.parts.settings.hold(workshopId);
    const payment = await this.parts.payments.lock(workshopId, paymentId);
    const invoice = await this.payable(workshopId, payment.clientId, share);
    this.mustBeIn(payment.currency, invoice.currency);
    if (share.amount_minor > payment.creditMinor)
      throw new Rejection('conflict', 'payment-no-credit', { values: { credit_minor: payment.creditMinor } });
    await this.parts.settling.share(payment, [share]);
    await this.parts.audit.record(actor, {
      subject: { kind: 'payment', id: paymentId },
      code: 'history-payment-shared',
      values: { amount_minor: share.amount_minor, number: invoice.number ?? '' },
    });
    return this.parts.payments.get(workshopId, paymentId);
  }

  /** Gives up what is open of an invoice. */
  async writeOff(
    actor: Actor,
    invoiceId: string,
    { amount_minor, reason }: { amount_minor: MinorUnits; reason: string },
  ) {
    const { workshopId } = actor;
    await this.parts.settings.hold(workshopId);
    const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
    mustBeIssuedInvoice(invoice);
    if (amount_minor > invoice.openMinor)
      throw new Rejection('conflict', 'write-off-over', { values: { open_minor: invoice.openMinor } });
    await this.parts.payments.writeOffs.insert(workshopId, {
      ...{ id: newId(), invoiceId, amountMinor: amount_minor, reason, byName: actor.name },
      writtenOn: await todayIn(this.parts, workshopId),
      at: this.parts.clock.now(),
    });
    await this.parts.invoices.write(workshopId, invoiceId, { openMinor: invoice.openMinor - amount_minor });
    await this.parts.audit.record(actor, {
      subject: { kind: 'invoice', id: invoiceId },
      ...(invoice.jobId ? { jobId: invoice.jobId } : {}),
      code: 'history-written-off',
      values: { amount_minor, number: invoice.number ?? '', reason },
    });
    return this.parts.invoices.get(workshopId, invoiceId);
  }

  /** Writes a payment down, nothing of it put to an invoice yet. */
  async add(
    by: { readonly workshopId: string; readonly name: string },
    payment: Omit<PaymentRow, RecordedField> & Partial<Pick<PaymentRow, 'id' | 'deed' | 'follows'>>,
  ): Promise<PaymentRow> {
    const recorded = { recordedAt: this.parts.clock.now(), recordedBy: by.name };
    return this.parts.payments.insert(by.workshopId, {
      id: newId(),
      deed: null,
      follows: null,
      ...payment,
      ...recorded,
    });
  }

  private async mustFit(workshopId: string, entry: PaymentEntry): Promise<void> {
    if (entry.receivedOn > (await todayIn(this.parts, workshopId))) refuse(['receivedOn'], 'payment-late-day');
    const shared_minor = sumMinor(entry.shares.map(({ amount_minor }) => amount_minor));
    if (shared_minor > entry.amount_minor) refuse(['shares'], 'payment-shares-over');
    const { currency } = await this.parts.workshops.get(workshopId);
    if (entry.shares.length === 0) this.mustBeIn(entry.currency, currency);
    await this.parts.invoices.lockAll(
      workshopId,
      entry.shares.map(({ invoiceId }) => invoiceId),
    );
    for (const share of entry.shares) {
      const invoice = await this.payable(workshopId, entry.clientId, share);
      this.mustBeIn(entry.currency, invoice.currency);
    }
    const rest_minor = entry.amount_minor - shared_minor;
    if (rest_minor > 0 && entry.surplus === 'refuse')
      throw new Rejection('conflict', 'payment-over', { values: { rest_minor } });
  }

  private mustBeIn(paid: string, currency: string): void {
    if (paid !== currency) refuse(['currency'], 'payment-foreign-currency', { currency });
  }

  /** An issued invoice of the client with so much open. */
  private async payable(workshopId: string, clientId: string, { invoiceId, amount_minor }: Share): Promise<InvoiceRow> {
    const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
    mustBeIssuedInvoice(invoice);
    const number = invoice.number ?? '';
    if (invoice.clientId !== clientId) throw new Rejection('conflict', 'payment-other-client', { values: { number } });
    if (amount_minor > invoice.openMinor) {
      const values = { number, open_minor: invoice.openMinor };
      throw new Rejection('conflict', 'payment-over-invoice', { values });
    }
    return invoice;
  }
}
