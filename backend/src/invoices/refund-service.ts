import type { Actor } from '#shared/actor/actor';
import type { RefundEntry } from '#shared/invoices/payment-schema';
import { sumMinor } from '#shared/money/sum-minor';
import { Rejection } from '#shared/problems/rejection';
import type { CardPayments } from '../platform/card-payments/card-payments';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { MoneyBackService } from './money-back-service';
import type { PaymentRow } from './payment-model';

interface Parts extends InvoiceParts {
  readonly moneyBack: MoneyBackService;
  readonly cards: CardPayments;
}

const lateDay = (): Rejection =>
  new Rejection('invalid', 'problem-invalid', {
    complaints: [{ path: ['refundedOn'], code: 'refund-late-day', values: {} }],
  });

/** Money given back: out of what lies to the client's credit, and beyond that out of what invoices hold, which are open again then. */
export class RefundService {
  constructor(private readonly parts: Parts) {}

  async refund(actor: Actor, paymentId: string, entry: RefundEntry): Promise<PaymentRow> {
    const payment = await this.parts.payments.get(actor.workshopId, paymentId);
    return payment.way === 'card' ? this.toCard(actor, payment, entry) : this.byHand(actor, paymentId, entry);
  }

  private async byHand(actor: Actor, paymentId: string, entry: RefundEntry): Promise<PaymentRow> {
    await this.parts.settings.hold(actor.workshopId);
    const payment = await this.parts.payments.lock(actor.workshopId, paymentId);
    const known = await this.known(payment, entry);
    return known ?? this.parts.moneyBack.give(actor, payment, { ...entry, externalId: null, id: entry.refundId });
  }

  /** Nothing is held while the service is asked: it gives no more back than was paid, and once for each id; what it has done is written down. */
  private async toCard(actor: Actor, payment: PaymentRow, entry: RefundEntry): Promise<PaymentRow> {
    const { workshopId } = actor;
    const before = await this.known(payment, entry);
    if (before) return before;
    const externalId = await this.throughService(payment, entry);
    await this.parts.settings.hold(workshopId);
    const current = await this.parts.payments.lock(workshopId, payment.id);
    // Told of meanwhile, or given back by a server that stopped before it wrote this down.
    const told = await this.parts.payments.byExternal(workshopId, externalId);
    return told ?? this.parts.moneyBack.give(actor, current, { ...entry, externalId, id: entry.refundId });
  }

  /** The same refund, where it was entered before; else everything that speaks against it is said. */
  private async known(payment: PaymentRow, entry: RefundEntry): Promise<PaymentRow | undefined> {
    const known = await this.parts.payments.find(payment.workshopId, entry.refundId);
    if (known) return this.sameAs(known, payment, entry);
    await this.mustBeLeft(payment, entry);
    if (entry.refundedOn > (await todayIn(this.parts, payment.workshopId))) throw lateDay();
    return undefined;
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
    const asked = { intentId: payment.externalId ?? '', amount_minor, refundId };
    const { id, standing } = await this.parts.cards.refund(asked).catch(() => {
      throw new Rejection('unavailable', 'refund-unreachable', { retryAfter_seconds: 30 });
    });
    if (standing === 'failed') throw new Rejection('conflict', 'refund-failed');
    return id;
  }
}
