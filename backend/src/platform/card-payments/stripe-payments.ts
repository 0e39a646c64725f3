import { createHash } from 'node:crypto';
import Stripe from 'stripe';
import type { CardDispute, CardEvent, CardOrder, CardPayments, CardRefund, CardState } from './card-payments';

/** Keys, and where the service is when it is not where it is for everybody. */
export interface StripeSettings {
  readonly secretKey: string;
  readonly webhookSecret: string;
  readonly at?: { readonly host: string; readonly port: number };
}

const tolerance_seconds = 300;

/** The time a signature was made at, in seconds since 1970; NaN where it names none. */
const signedAt = (signature: string): number => Number(/(?:^|,)t=(\d{1,12})(?:,|$)/.exec(signature)?.[1] ?? Number.NaN);

const idOf = (value: string | { id: string } | null | undefined): string | null =>
  typeof value === 'string' ? value : (value?.id ?? null);

function standingOf(status: string | null): CardRefund['standing'] {
  if (status === 'succeeded') return 'done';
  return status === 'failed' || status === 'canceled' ? 'failed' : 'waiting';
}

const refundOf = ({ id, amount, status }: Pick<Stripe.Refund, 'id' | 'amount' | 'status'>): CardRefund => ({
  id,
  amount_minor: amount,
  standing: standingOf(status),
});

/** The bank only asks under the names that begin with a warning; it takes the money with the dispute itself, and leaves it once that is lost. */
const taking: readonly string[] = ['needs_response', 'under_review', 'lost'];

const disputeOf = ({ id, amount, currency, status }: Stripe.Dispute): CardDispute => ({
  id,
  amount_minor: amount,
  currency: currency.toUpperCase(),
  isTaken: taking.includes(status),
});

/** The same order begins one session however often it is sent; another order has to have another key, or the service refuses it. */
const keyOf = (order: CardOrder): string =>
  `begin-${order.checkoutId}-${createHash('sha256').update(JSON.stringify(order)).digest('hex').slice(0, 16)}`;

function statusOf({ status, payment_status }: Stripe.Checkout.Session): CardState['status'] {
  if (payment_status === 'paid') return 'paid';
  return status === 'expired' ? 'expired' : 'open';
}

/** The payment service Stripe, through its own SDK. */
export class StripePayments implements CardPayments {
  private readonly stripe: Stripe;

  constructor(private readonly settings: StripeSettings) {
    const { at } = settings;
    this.stripe = new Stripe(settings.secretKey, {
      timeout: 5_000,
      maxNetworkRetries: 1,
      telemetry: false,
      ...(at ? { host: at.host, port: at.port, protocol: 'http' as const } : {}),
    });
  }

  async begin(order: CardOrder): Promise<{ sessionId: string; url: string }> {
    const session = await this.stripe.checkout.sessions.create(
      {
        mode: 'payment',
        client_reference_id: order.checkoutId,
        metadata: { checkoutId: order.checkoutId },
        payment_intent_data: { metadata: { checkoutId: order.checkoutId } },
        line_items: [
          {
            quantity: 1,
            price_data: {
              currency: order.currency.toLowerCase(),
              unit_amount: order.amount_minor,
              product_data: { name: order.title },
            },
          },
        ],
        success_url: order.returnUrl,
        cancel_url: order.returnUrl,
        ...(order.email === '' ? {} : { customer_email: order.email }),
      },
      { idempotencyKey: keyOf(order) },
    );
    if (session.url === null) throw new Error('the payment service named no page to pay on');
    return { sessionId: session.id, url: session.url };
  }

  async state(sessionId: string): Promise<CardState> {
    const session = await this.stripe.checkout.sessions.retrieve(sessionId);
    const intentId = idOf(session.payment_intent);
    const of = { payment_intent: intentId ?? '', limit: 100 };
    const [refunds, disputes] =
      intentId === null
        ? [[], []]
        : [(await this.stripe.refunds.list(of)).data, (await this.stripe.disputes.list(of)).data];
    return {
      status: statusOf(session),
      amount_minor: session.amount_total ?? 0,
      currency: (session.currency ?? '').toUpperCase(),
      intentId,
      refunds: refunds.map(refundOf),
      disputes: disputes.map(disputeOf),
    };
  }

  async end(sessionId: string): Promise<void> {
    await this.stripe.checkout.sessions.expire(sessionId);
  }

  async refund(asked: { intentId: string; amount_minor: number; refundId: string }): Promise<CardRefund> {
    const refund = await this.stripe.refunds.create(
      { payment_intent: asked.intentId, amount: asked.amount_minor, metadata: { refundId: asked.refundId } },
      { idempotencyKey: `refund-${asked.refundId}` },
    );
    return refundOf(refund);
  }

  /** The SDK compares in constant time and refuses what is old; what comes from the future is refused here. */
  event({ bytes, signature }: { bytes: Buffer; signature: string }, now: Date): CardEvent {
    const { webhookSecret } = this.settings;
    const received = now.getTime();
    if (signedAt(signature) * 1_000 - received > tolerance_seconds * 1_000)
      throw new Error('the event is from the future');
    const event = this.stripe.webhooks.constructEvent(
      bytes,
      signature,
      webhookSecret,
      tolerance_seconds,
      undefined,
      received,
    );
    return eventOf(event);
  }
}

/** What an event tells to ask about; of a kind nobody here knows, only that it came. */
function eventOf({ id, type, data }: Stripe.Event): CardEvent {
  const about = data.object as unknown as {
    id?: string;
    object?: string;
    payment_intent?: string | { id: string } | null;
    metadata?: { checkoutId?: string } | null;
  };
  const isSession = about.object === 'checkout.session';
  const isIntent = about.object === 'payment_intent';
  return {
    id,
    kind: type,
    sessionId: isSession ? (about.id ?? null) : null,
    intentId: isIntent ? (about.id ?? null) : idOf(about.payment_intent),
    checkoutId: about.metadata?.checkoutId ?? null,
  };
}
