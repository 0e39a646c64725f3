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
  readonly status: 'succeeded' | 'pending' | 'failed';
  readonly payment_intent: string;
  readonly metadata: Readonly<Record<string, string>>;
}

export interface StandInDispute {
  readonly id: string;
  readonly object: 'dispute';
  readonly amount: number;
  readonly currency: string;
  readonly status: 'warning_needs_response' | 'needs_response' | 'under_review' | 'won' | 'lost';
  readonly payment_intent: string;
}

type Fields = Readonly<Record<string, string>>;

/** The fields of a form, by the names the SDK gives them (`metadata[checkoutId]`). */
export const fieldsOf = (body: string): Record<string, string> => Object.fromEntries(new URLSearchParams(body));

const product = 'line_items[0][price_data]';

const changedIn = <T extends { readonly id: string }>(rows: T[], id: string, change: Partial<T>): T => {
  const place = rows.findIndex((row) => row.id === id);
  if (place < 0) throw new Error('there is none of this name');
  return (rows[place] = { ...rows[place], ...change });
};

/** What the stand-in remembers: sessions, what was given back, and what a bank disputes. */
export class StandInLedger {
  private readonly sessions = new Map<string, StandInSession>();
  private readonly refunds: StandInRefund[] = [];
  private readonly disputes: StandInDispute[] = [];

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

  /** A refund that was done may fail days later, when the bank sends the money back. */
  changeRefund(id: string, status: StandInRefund['status']): StandInRefund {
    return changedIn(this.refunds, id, { status });
  }

  disputesOf(intentId: string): StandInDispute[] {
    return this.disputes.filter((dispute) => dispute.payment_intent === intentId);
  }

  /** What a bank does for its payer: all of the payment, unless it says otherwise. */
  dispute(intentId: string, more: Partial<StandInDispute> = {}): StandInDispute {
    const paid = this.paidBy(intentId);
    if (!paid) throw new Error('there is no such payment');
    const dispute: StandInDispute = {
      ...{ id: `du_${randomUUID().replace(/-/g, '')}`, object: 'dispute', status: 'needs_response' },
      ...{ amount: paid.amount_total, currency: paid.currency, payment_intent: intentId },
      ...more,
    };
    this.disputes.push(dispute);
    return dispute;
  }

  changeDispute(id: string, status: StandInDispute['status']): StandInDispute {
    return changedIn(this.disputes, id, { status });
  }

  refund(fields: Fields): StandInRefund {
    const intentId = fields['payment_intent'] ?? '';
    const paid = this.paidBy(intentId);
    const amount = Number(fields['amount']);
    const standing = this.refundsOf(intentId).filter(({ status }) => status !== 'failed');
    const before = standing.reduce((sum, refund) => sum + refund.amount, 0);
    if (!paid || !(amount >= 1) || before + amount > paid.amount_total) throw new Error('that much was not paid');
    const refund: StandInRefund = {
      ...{ id: `re_${randomUUID().replace(/-/g, '')}`, object: 'refund', amount, status: 'succeeded' },
      ...{ payment_intent: intentId, metadata: { refundId: fields['metadata[refundId]'] ?? '' } },
    };
    this.refunds.push(refund);
    return refund;
  }

  private paidBy(intentId: string): StandInSession | undefined {
    return [...this.sessions.values()].find((session) => session.payment_intent === intentId);
  }

  private change(id: string, change: Partial<StandInSession>): StandInSession {
    const session = this.sessions.get(id);
    if (session?.status !== 'open') throw new Error('this session is not open');
    const changed = { ...session, ...change };
    this.sessions.set(id, changed);
    return changed;
  }
}
