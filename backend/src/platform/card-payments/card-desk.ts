import type { CardEvent, CardOrder, CardPayments, CardRefund, CardState } from './card-payments';

/** The payment service that is connected, if any: the live one by its keys, or the one that stands in for it on this machine. */
export class CardDesk implements CardPayments {
  private service: CardPayments | undefined;

  connect(service: CardPayments): void {
    this.service = service;
  }

  get isConnected(): boolean {
    return this.service !== undefined;
  }

  begin(order: CardOrder): Promise<{ sessionId: string; url: string }> {
    return this.connected((service) => service.begin(order));
  }

  state(sessionId: string): Promise<CardState> {
    return this.connected((service) => service.state(sessionId));
  }

  end(sessionId: string): Promise<void> {
    return this.connected((service) => service.end(sessionId));
  }

  refund(asked: { intentId: string; amount_minor: number; refundId: string }): Promise<CardRefund> {
    return this.connected((service) => service.refund(asked));
  }

  event(signed: { bytes: Buffer; signature: string }, now: Date): CardEvent {
    if (!this.service) throw new Error('no payment service is connected');
    return this.service.event(signed, now);
  }

  private connected<T>(work: (service: CardPayments) => Promise<T>): Promise<T> {
    return this.service ? work(this.service) : Promise.reject(new Error('no payment service is connected'));
  }
}
