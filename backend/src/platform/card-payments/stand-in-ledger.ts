import { randomUUID } from 'node:crypto';

/** A checkout session as the service answers it, as far as anything here asks. */
export interface StandInSession {
  readonly id: string;
  readonly object: 'checkout.session';
  readonly status: 'open' | 'complete' | 'expired';
  readonly payment_status: 'paid' | 'unpaid';
  readonly payment_intent: string | null;
  readonly amount_total: number;
  readonly currency: string;
  readonly metadata: Readonly<Record<string, string>>;
  readonly client_reference_id: string;
  readonly url: string | null;
  readonly success_url: string;
  readonly title: string;
}

export interface StandInRefund {
  readonly id: string;
  readonly object: 'refund';
  readonly amount: number;
  readonly status: 'succeeded';
  readonly payment_intent: string;
  readonly metadata: Readonly<Record<string, string>>;
}

type Fields = Readonly<Record<string, string>>;

/** The fields of a form, by the names the SDK gives them (`metadata[checkoutId]`). */
export const fieldsOf = (body: string): Record<string, string> => Object.fromEntries(new URLSearchParams(body));

const product = 'line_items[0][price_data]';

/** What the stand-in remembers: sessions, and what was given back. */
export class StandInLedger {
  private readonly sessions = new Map<string, StandInSession>();
  private readonly refunds: StandInRefund[] = [];

  begin(fields: Fields, address: string): StandInSession {
    const id = `cs_test_${randomUUID().replace(/-/g, '')}`;
    const session: StandInSession = {
      ...{ id, object: 'checkout.session', status: 'open', payment_status: 'unpaid', payment_intent: null },
      amount_total: Number(fields[`${product}[unit_amount]`]),
      currency: fields[`${product}[currency]`] ?? '',
      metadata: { checkoutId: fields['metadata[checkoutId]'] ?? '' },
      client_reference_id: fields['client_reference_id'] ?? '',
      url: `${address}/pay/${id}`,
      success_url: fields['success_url'] ?? '',
      title: fields[`${product}[product_data][name]`] ?? '',
    };
    if (!Number.isSafeInteger(session.amount_total) || session.amount_total < 1) throw new Error('no such amount');
    this.sessions.set(id, session);
    return session;
  }

  session(id: string): StandInSession | undefined {
    return this.sessions.get(id);
  }

  pay(id: string): StandInSession {
    return this.change(id, {
      status: 'complete',
      payment_status: 'paid',
      payment_intent: `pi_${randomUUID().replace(/-/g, '')}`,
      url: null,
    });
  }

  expire(id: string): StandInSession {
    return this.change(id, { status: 'expired', url: null });
  }

  refundsOf(intentId: string): StandInRefund[] {
    return this.refunds.filter((refund) => refund.payment_intent === intentId);
  }

  refund(fields: Fields): StandInRefund {
    const intentId = fields['payment_intent'] ?? '';
    const paid = [...this.sessions.values()].find((session) => session.payment_intent === intentId);
    const amount = Number(fields['amount']);
    const before = this.refundsOf(intentId).reduce((sum, refund) => sum + refund.amount, 0);
    if (!paid || !(amount >= 1) || before + amount > paid.amount_total) throw new Error('that much was not paid');
    const refund: StandInRefund = {
      ...{ id: `re_${randomUUID().replace(/-/g, '')}`, object: 'refund', amount, status: 'succeeded' },
      ...{ payment_intent: intentId, metadata: { refundId: fields['metadata[refundId]'] ?? '' } },
    };
    this.refunds.push(refund);
    return refund;
  }

  private change(id: string, change: Partial<StandInSession>): StandInSession {
    const session = this.sessions.get(id);
    if (session?.status !== 'open') throw new Error('this session is not open');
    const changed = { ...session, ...change };
    this.sessions.set(id, changed);
    return changed;
  }
}
