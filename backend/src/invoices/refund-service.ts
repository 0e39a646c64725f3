import type { Actor } from '#shared/actor/actor';
import type { RefundEntry } from '#shared/invoices/payment-schema';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { Rejection } from '#shared/problems/rejection';
import type { Doer } from '../audit';
import type { CardPayments } from '../platform/card-payments/card-payments';
import type { CheckoutRepository } from './checkout-repository';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { PaymentRow } from './payment-model';
import type { PaymentService } from './payment-service';
import type { SettlingService } from './settling-service';

interface Parts extends InvoiceParts {
  readonly recording: PaymentService;
  readonly settling: SettlingService;
  readonly cards: CardPayments;
  readonly checkouts: CheckoutRepository;
}

const lateDay = (): Rejection =>
  new Rejection('invalid', 'problem-invalid', {
    complaints: [{ path: ['refundedOn'], code: 'refund-late-day', values: {} }],
  });

/** Money given back: out of what lies to the client's credit, and beyond that out of what invoices hold, which are open again then. */
export class RefundService {
  constructor(private readonly parts: Parts) {}

  async refund(actor: Actor, paymentId: string, entry: RefundEntry): Promise<PaymentRow> {
    const { workshopId } = actor;
    await this.parts.settings.hold(workshopId);
    const payment = await this.parts.payments.lock(workshopId, paymentId);
    const known = await this.parts.payments.find(workshopId, entry.refundId);
    if (known) return this.sameAs(known, payment, entry);
    await this.mustBeLeft(payment, entry);
    if (entry.refundedOn > (await todayIn(this.parts, workshopId))) throw lateDay();
    const externalId = payment.way === 'card' ? await this.throughService(payment, entry) : null;
    // Given back before, by a server that stopped before it wrote this down: the service has told of it meanwhile.
    const told = externalId === null ? undefined : await this.parts.payments.byExternal(workshopId, externalId);
    if (told) return told;
    return this.write(actor, payment, { ...entry, externalId, id: entry.refundId });
  }

  /** Writes down a refund that the payment service tells of, once. */
  async told(
    by: Doer,
    payment: PaymentRow,
    refund: { externalId: string; amount_minor: MinorUnits; refundedOn: string },
  ): Promise<void> {
    if (await this.parts.payments.byExternal(payment.workshopId, refund.externalId)) return;
    const current = await this.parts.payments.lock(payment.workshopId, payment.id);
    await this.write(by, current, { ...refund, reference: '' });
  }

  private async write(
    by: Doer,
    payment: PaymentRow,
    refund: { id?: string; externalId: string | null; amount_minor: MinorUnits; refundedOn: string; reference: string },
  ): Promise<PaymentRow> {
    const { workshopId, clientId, way, currency } = payment;
    const { amount_minor, externalId, refundedOn, reference, id } = refund;
    const beyond_minor = Math.max(0, amount_minor - payment.creditMinor);
    if (beyond_minor > 0) await this.parts.settling.reopen(payment, beyond_minor);
    const { creditMinor } = await this.parts.payments.lock(workshopId, payment.id);
    await this.parts.payments.write(workshopId, payment.id, { creditMinor: creditMinor - amount_minor });
    const row = await this.parts.recording.add(by, {
      ...(id === undefined ? {} : { id }),
      ...{ clientId, way, currency, amountMinor: -amount_minor, creditMinor: 0, receivedOn: refundedOn, reference },
      ...{ refundsPaymentId: payment.id, externalId },
    });
    const client = await this.parts.jobs.client(workshopId, clientId);
    const subject = { kind: 'payment', id: row.id };
    await this.parts.audit.record(by, {
      subject,
      code: 'history-refunded',
      values: { amount_minor, client: client.name },
    });
    return row;
  }

  /** Entered before: what is asked again has to be the same, or somebody would believe that money went back. */
  private sameAs(known: PaymentRow, payment: PaymentRow, { amount_minor }: RefundEntry): PaymentRow {
    if (known.refundsPaymentId !== payment.id || known.amountMinor !== -amount_minor)
      throw new Rejection('conflict', 'refund-id-used');
    return known;
  }

  private async mustBeLeft(payment: PaymentRow, { amount_minor, reopens }: RefundEntry): Promise<void> {
    if (payment.refundsPaymentId !== null) throw new Rejection('conflict', 'refund-of-refund');
    const before = await this.parts.payments.refundsOf(payment.workshopId, payment.id);
    const left_minor = sumMinor([payment.amountMinor, ...before.map(({ amountMinor }) => amountMinor)]);
    if (amount_minor > left_minor) throw new Rejection('conflict', 'refund-over', { values: { left_minor } });
    if (amount_minor > payment.creditMinor && !reopens) throw new Rejection('conflict', 'refund-reopens');
  }

  /** The service knows a refund by its id, so that asking again for the same one gives back once. */
  private async throughService(payment: PaymentRow, { amount_minor, refundId }: RefundEntry): Promise<string> {
    try {
      const { id } = await this.parts.cards.refund({ intentId: payment.externalId ?? '', amount_minor, refundId });
      return id;
    } catch {
      throw new Rejection('unavailable', 'refund-unreachable', { retryAfter_seconds: 30 });
    }
  }
}
