import { v7 as newId } from 'uuid';
import { currencyDigits } from '#shared/money/currency-digits';
import type { UnknownPaymentEvent } from '#shared/invoices/payment-schema';
import { paymentShares } from '#shared/invoices/payment-shares';
import { Rejection } from '#shared/problems/rejection';
import type { Doer } from '../audit';
import type { CardEvent, CardPayments, CardState } from '../platform/card-payments/card-payments';
import type { Database } from '../platform/database/database';
import { outsideTransaction } from '../platform/database/is-in-transaction';
import type { SignedBody } from '../platform/http/call';
import type { CheckoutRepository } from './checkout-repository';
import type { InvoiceRow } from './invoice-model';
import { todayIn, wordsOf, type InvoiceParts } from './invoice-parts';
import { mustBeIssuedInvoice } from './invoice-policy';
import type { ReceiptLetters } from './invoice-letters';
import type { CheckoutRow, PaymentRow } from './payment-model';
import type { PaymentService } from './payment-service';
import type { RefundService } from './refund-service';
import type { SettlingService } from './settling-service';

interface Parts extends InvoiceParts {
  readonly database: Database;
  readonly checkouts: CheckoutRepository;
  readonly cards: CardPayments;
  readonly recording: PaymentService;
  readonly refunds: RefundService;
  readonly settling: SettlingService;
  readonly letters: ReceiptLetters;
}

/** Who begins a payment by card, and where they come back to. */
export interface Payer {
  readonly accessId: string;
  readonly name: string;
  readonly email: string;
  readonly returnUrl: (checkoutId: string) => string;
}

/** The service counts the ariary, of two decimals by ISO 4217, in whole ones; others than two decimals it counts by rules of its own. */
const isCharged = (currency: string): boolean => currencyDigits(currency) === 2 && currency !== 'MGA';

/** Payments by card: begun over what is open by our own record, and recorded once, whoever tells of them first. */
export class CheckoutService {
  constructor(private readonly parts: Parts) {}

  /** Whether a currency can be charged to a card here. */
  mayCharge(currency: string): boolean {
    return isCharged(currency);
  }

  get(workshopId: string, checkoutId: string): Promise<CheckoutRow> {
    return this.parts.checkouts.get(workshopId, checkoutId);
  }

  /** Begins a payment of what is open; one begun over the same amount goes on while its page stands, one over another amount is ended. */
  async begin(workshopId: string, invoiceId: string, payer: Payer): Promise<CheckoutRow> {
    await this.parts.settings.hold(workshopId);
    const invoice = await this.parts.invoices.get(workshopId, invoiceId);
    mustBeIssuedInvoice(invoice);
    if (invoice.openMinor <= 0) throw new Rejection('conflict', 'checkout-nothing-open');
    const { currency } = invoice;
    if (!isCharged(currency)) throw new Rejection('conflict', 'checkout-currency', { values: { currency } });
    for (const open of await this.parts.checkouts.openOf(workshopId, invoiceId)) {
      const known = await this.asked(open);
      const goesOn = known.state === 'open' && known.url !== null && known.amountMinor === invoice.openMinor;
      if (goesOn || known.state === 'paid') return known;
      if (known.state === 'open') await this.giveUp(known);
    }
    return this.beginAnew(invoice, payer);
  }

  /** Asks the service where a payment stands and records what it says; the same way an event goes. */
  async ask(workshopId: string, checkoutId: string): Promise<CheckoutRow> {
    return this.asked(await this.parts.checkouts.get(workshopId, checkoutId));
  }

  /** Takes a signed event once. What it tells is only where to look: the service itself says how things stand. */
  async take(signed: SignedBody): Promise<void> {
    const event = this.believed(signed);
    const content = signed.bytes.toString('utf8');
    const receivedAt = this.parts.clock.now();
    if (!(await this.parts.checkouts.isNew({ id: event.id, kind: event.kind, content, receivedAt }))) return;
    const checkout = await this.about(event);
    if (!checkout) return;
    await this.parts.checkouts.nameEvent(event.id, checkout.id);
    await this.settle(checkout, event.sessionId);
  }

  /** Events that spoke of no payment known to any workshop, the newest first. */
  unknownEvents(): Promise<UnknownPaymentEvent[]> {
    return this.parts.checkouts.unknownEvents();
  }

  /** Events get lost, and the service ends what nobody pays within a day. */
  private async asked(checkout: CheckoutRow): Promise<CheckoutRow> {
    if (checkout.sessionId !== null) await this.settle(checkout);
    return this.parts.checkouts.get(checkout.workshopId, checkout.id);
  }

  private believed(signed: SignedBody): CardEvent {
    try {
      return this.parts.cards.event(signed, this.parts.clock.now());
    } catch {
      throw new Rejection('invalid', 'signature-wrong');
    }
  }

  private async about({ sessionId, intentId, checkoutId }: CardEvent): Promise<CheckoutRow | undefined> {
    const { checkouts } = this.parts;
    return (
      (sessionId === null ? undefined : await checkouts.bySession(sessionId)) ??
      (intentId === null ? undefined : await checkouts.byIntent(intentId)) ??
      (checkoutId === null || checkoutId === '' ? undefined : await checkouts.byId(checkoutId))
    );
  }

  /** Our row stands before the service is asked, and stays if the rest fails: what is paid on it will be known. */
  private async beginAnew(invoice: InvoiceRow, payer: Payer): Promise<CheckoutRow> {
    const { workshopId, openMinor, currency } = invoice;
    const id = newId();
    const title = (await wordsOf(this.parts, workshopId)).say('paper-invoice-title', {
      kind: 'invoice',
      number: invoice.number ?? '',
    });
    const order = {
      checkoutId: id,
      amount_minor: openMinor,
      currency,
      title,
      email: payer.email,
      returnUrl: payer.returnUrl(id),
    };
    await outsideTransaction(() => this.insert(invoice, id, payer));
    const begun = await this.reached(() => this.parts.cards.begin(order));
    await this.parts.checkouts.write(workshopId, id, begun);
    await this.record({ workshopId, accountId: null, name: payer.name }, invoice);
    return this.parts.checkouts.get(workshopId, id);
  }

  private insert(
    { workshopId, id: invoiceId, openMinor, currency }: InvoiceRow,
    id: string,
    payer: Payer,
  ): Promise<unknown> {
    return this.parts.checkouts.insert(workshopId, {
      ...{ id, invoiceId, accessId: payer.accessId, state: 'open', amountMinor: openMinor, currency },
      ...{ sessionId: null, url: null, intentId: null, createdAt: this.parts.clock.now() },
    });
  }

  /** Ends a payment nobody will make any more; one that was made in this very moment is not lost, its event is still to come. */
  private async giveUp(checkout: CheckoutRow): Promise<void> {
    const { sessionId } = checkout;
    if (sessionId !== null) await this.parts.cards.end(sessionId).catch(() => undefined);
    await this.parts.checkouts.write(checkout.workshopId, checkout.id, { state: 'expired', url: null });
  }

  /** The one way a payment by card enters the books, from an event or from asking: looked up, held, recorded once. */
  private async settle(found: CheckoutRow, toldSession: string | null = null): Promise<void> {
    const { workshopId, id } = found;
    const sessionId = found.sessionId ?? toldSession;
    if (sessionId === null) return;
    const state = await this.reached(() => this.parts.cards.state(sessionId));
    await this.parts.settings.hold(workshopId);
    const checkout = await this.parts.checkouts.lock(workshopId, id);
    if (state.intentId !== null && checkout.intentId === null)
      await this.parts.checkouts.write(workshopId, id, { intentId: state.intentId, sessionId });
    if (state.status === 'paid') await this.enter(checkout, state);
    else if (checkout.state === 'open' && state.status !== 'open')
      await this.parts.checkouts.write(workshopId, id, { state: state.status, url: null });
  }

  private async enter(checkout: CheckoutRow, state: CardState): Promise<void> {
    const { workshopId } = checkout;
    if (state.amount_minor !== checkout.amountMinor || state.currency !== checkout.currency || state.intentId === null)
      throw new Error(`checkout ${checkout.id} was paid over another amount than it was begun over`);
    const invoice = await this.parts.invoices.lock(workshopId, checkout.invoiceId);
    const by = { workshopId, accountId: null, name: invoice.content.buyer.name };
    const known = await this.parts.payments.byExternal(workshopId, state.intentId);
    const payment = known ?? (await this.enterPayment(by, { checkout, invoice, intentId: state.intentId }));
    const refundedOn = await todayIn(this.parts, workshopId);
    for (const { id: externalId, amount_minor, isDone } of state.refunds)
      if (isDone) await this.parts.refunds.told(by, payment, { externalId, amount_minor, refundedOn });
  }

  private async enterPayment(
    by: Doer,
    { checkout, invoice, intentId }: { checkout: CheckoutRow; invoice: InvoiceRow; intentId: string },
  ): Promise<PaymentRow> {
    const { workshopId, amountMinor, currency } = checkout;
    const payment = await this.parts.recording.add(by, {
      ...{ clientId: invoice.clientId, way: 'card', currency, amountMinor, creditMinor: amountMinor },
      ...{ receivedOn: await todayIn(this.parts, workshopId), reference: invoice.number ?? '' },
      ...{ refundsPaymentId: null, externalId: intentId },
    });
    const open = [{ invoiceId: invoice.id, open_minor: invoice.openMinor }];
    await this.parts.settling.share(payment, paymentShares(amountMinor, open).shares);
    await this.parts.checkouts.write(workshopId, checkout.id, { state: 'paid', url: null });
    await this.parts.audit.record(by, {
      subject: { kind: 'payment', id: payment.id },
      ...(invoice.jobId ? { jobId: invoice.jobId } : {}),
      code: 'history-payment-card',
      values: { client: by.name, amount_minor: amountMinor },
    });
    await this.parts.letters.receipt(invoice, amountMinor);
    return this.parts.payments.get(workshopId, payment.id);
  }

  private async reached<T>(work: () => Promise<T>): Promise<T> {
    try {
      return await work();
    } catch {
      throw new Rejection('unavailable', 'checkout-unreachable', { retryAfter_seconds: 10 });
    }
  }

  private record(by: Doer, { id, jobId, number }: InvoiceRow): Promise<void> {
    const subject = { kind: 'invoice', id };
    const code = 'history-checkout-begun';
    return this.parts.audit.record(by, {
      subject,
      ...(jobId ? { jobId } : {}),
      code,
      values: { number: number ?? '' },
    });
  }
}
