/** A payment by card to be begun, of an amount from our own record. */
export interface CardOrder {
  /** Our own id of it: the service keeps it, and asking twice with it begins once. */
  readonly checkoutId: string;
  readonly amount_minor: number;
  /** ISO 4217. */
  readonly currency: string;
  readonly title: string;
  readonly email: string;
  /** Where the payer comes back to, paid or not. */
  readonly returnUrl: string;
}

/** What the service says of money given back; one that failed came back to us, even where it was done before. */
export interface CardRefund {
  readonly id: string;
  readonly amount_minor: number;
  readonly standing: 'waiting' | 'done' | 'failed';
}

/** A payment the payer’s bank disputes: while it is undecided, and where it is lost, the money is taken from us. */
export interface CardDispute {
  readonly id: string;
  readonly amount_minor: number;
  /** ISO 4217; a bank may name the amount in a currency of its own. */
  readonly currency: string;
  readonly isTaken: boolean;
}

/** Where a payment stands with the service, what was given back of it, and what was taken back. */
export interface CardState {
  readonly status: 'open' | 'paid' | 'expired' | 'refused';
  readonly amount_minor: number;
  readonly currency: string;
  readonly intentId: string | null;
  readonly refunds: readonly CardRefund[];
  readonly disputes: readonly CardDispute[];
}

/** An event whose signature fits, as far as it tells what to ask about. */
export interface CardEvent {
  readonly id: string;
  readonly kind: string;
  readonly sessionId: string | null;
  readonly intentId: string | null;
  readonly checkoutId: string | null;
}

/** A payment service. Every method rejects when the service cannot be reached or refuses; `event` when the signature does not fit. */
export interface CardPayments {
  begin(order: CardOrder): Promise<{ readonly sessionId: string; readonly url: string }>;
  state(sessionId: string): Promise<CardState>;
  /** Ends a payment that was begun, so that it can no longer be paid. */
  end(sessionId: string): Promise<void>;
  refund(asked: { intentId: string; amount_minor: number; refundId: string }): Promise<CardRefund>;
  /** Reads a signed event; `now` decides whether it is too old, or from the future. */
  event(signed: { bytes: Buffer; signature: string }, now: Date): CardEvent;
}
