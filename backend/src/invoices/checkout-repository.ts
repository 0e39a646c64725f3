import type { UnknownPaymentEvent } from '#shared/invoices/payment-schema';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import { checkoutTable, type CheckoutRow } from './payment-model';

/** Payments by card that were begun, and what the payment service told of them. */
export class CheckoutRepository extends WorkshopRows<CheckoutRow> {
  constructor(private readonly database: Database) {
    super(checkoutTable(database));
  }

  /** Those of an invoice that may still be paid. */
  openOf(workshopId: string, invoiceId: string): Promise<CheckoutRow[]> {
    return this.list(workshopId, { where: { invoiceId, state: 'open' } });
  }

  /** The service knows nothing of workshops, so what it tells of is found by its own names, which are different in every row. */
  async bySession(sessionId: string): Promise<CheckoutRow | undefined> {
    return this.found('session_id = :name', sessionId);
  }

  async byIntent(intentId: string): Promise<CheckoutRow | undefined> {
    return this.found('intent_id = :name', intentId);
  }

  async byId(id: string): Promise<CheckoutRow | undefined> {
    return this.found('id = :name', id);
  }

  async isKnown(eventId: string): Promise<boolean> {
    const rows = await this.database.select('SELECT id FROM payment_events WHERE id = :eventId', { eventId });
    return rows.length > 0;
  }

  /** Notes an event, once. */
  async keepEvent(event: {
    readonly id: string;
    readonly kind: string;
    readonly content: string;
    readonly receivedAt: Date;
    readonly checkoutId: string | null;
  }): Promise<void> {
    await this.database.execute(
      `INSERT IGNORE INTO payment_events (id, kind, content, received_at, checkout_id)
       VALUES (:id, :kind, :content, :receivedAt, :checkoutId)`,
      event,
    );
  }

  /** Only the service's name of an event, its kind and when it came: what it holds may be anybody's. */
  async unknownEvents(): Promise<UnknownPaymentEvent[]> {
    const rows = await this.database.select<Omit<UnknownPaymentEvent, 'receivedAt'> & { receivedAt: Date }>(
      `SELECT id, kind, received_at AS receivedAt FROM payment_events WHERE checkout_id IS NULL
       ORDER BY received_at DESC, id DESC LIMIT 100`,
      {},
    );
    return rows.map(({ receivedAt, ...event }) => ({ ...event, receivedAt: receivedAt.toISOString() }));
  }

  private async found(
    condition: 'session_id = :name' | 'intent_id = :name' | 'id = :name',
    name: string,
  ): Promise<CheckoutRow | undefined> {
    const statements = {
      'session_id = :name': 'SELECT workshop_id AS workshopId, id FROM checkouts WHERE session_id = :name',
      'intent_id = :name': 'SELECT workshop_id AS workshopId, id FROM checkouts WHERE intent_id = :name',
      'id = :name': 'SELECT workshop_id AS workshopId, id FROM checkouts WHERE id = :name LIMIT 1',
    };
    const [row] = await this.database.select<{ workshopId: string; id: string }>(statements[condition], { name });
    return row && this.find(row.workshopId, row.id);
  }
}
