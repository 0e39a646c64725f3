import { Op } from 'sequelize';
import type { Share } from '#shared/invoices/payment-shares';
import type { Database } from '../platform/database/database';
import { WorkshopRows } from '../platform/database/workshop-rows';
import {
  paymentShareTable,
  paymentTable,
  writeOffTable,
  type PaymentRow,
  type PaymentShareRow,
  type WriteOffRow,
} from './payment-model';

interface Days {
  readonly from: string;
  readonly to: string;
}

/** Payments, what of them is for which invoice, and what was written off. */
export class PaymentRepository extends WorkshopRows<PaymentRow> {
  readonly shares: WorkshopRows<PaymentShareRow>;
  readonly writeOffs: WorkshopRows<WriteOffRow>;

  constructor(private readonly database: Database) {
    super(paymentTable(database));
    this.shares = new WorkshopRows(paymentShareTable(database));
    this.writeOffs = new WorkshopRows(writeOffTable(database));
  }

  async byExternal(workshopId: string, externalId: string): Promise<PaymentRow | undefined> {
    return (await this.list(workshopId, { where: { externalId }, limit: 1 }))[0];
  }

  /** What was written down of one refund or dispute of the payment service. */
  following(workshopId: string, outsideId: string): Promise<PaymentRow[]> {
    return this.list(workshopId, { where: { [Op.or]: [{ externalId: outsideId }, { follows: outsideId }] } });
  }

  refundsOf(workshopId: string, paymentId: string): Promise<PaymentRow[]> {
    return this.list(workshopId, { where: { refundsPaymentId: paymentId } });
  }

  /** What lies to clients' credit. */
  withCredit(workshopId: string): Promise<PaymentRow[]> {
    return this.list(workshopId, { where: { creditMinor: { [Op.gt]: 0 } } });
  }

  receivedBetween(workshopId: string, { from, to }: Days): Promise<PaymentRow[]> {
    return this.list(workshopId, { where: { receivedOn: { [Op.between]: [from, to] } } });
  }

  writtenOffBetween(workshopId: string, { from, to }: Days): Promise<WriteOffRow[]> {
    return this.writeOffs.list(workshopId, { where: { writtenOn: { [Op.between]: [from, to] } } });
  }

  writeOffsOf(workshopId: string, invoiceId: string): Promise<WriteOffRow[]> {
    return this.writeOffs.list(workshopId, { where: { invoiceId } });
  }

  sharesOf(workshopId: string, paymentIds: readonly string[]): Promise<PaymentShareRow[]> {
    if (paymentIds.length === 0) return Promise.resolve([]);
    return this.shares.list(workshopId, { where: { paymentId: [...paymentIds] } });
  }

  /** The invoices that a payment was taken back from, in the order they were paid. */
  async reopenedBy(workshopId: string, paymentId: string): Promise<string[]> {
    const rows = await this.database.select<{ invoiceId: string }>(
      `SELECT invoice_id AS invoiceId FROM payment_shares WHERE workshop_id = :workshopId AND payment_id = :paymentId
       GROUP BY invoice_id HAVING MIN(amount_minor) < 0 ORDER BY MIN(id)`,
      { workshopId, paymentId },
    );
    return rows.map(({ invoiceId }) => invoiceId);
  }

  /** What each invoice holds of a payment, what was taken back already counted. */
  heldOf(workshopId: string, paymentId: string): Promise<Share[]> {
    return this.database.select<Share>(
      `SELECT invoice_id AS invoiceId, CAST(SUM(amount_minor) AS SIGNED) AS amount_minor FROM payment_shares
       WHERE workshop_id = :workshopId AND payment_id = :paymentId
       GROUP BY invoice_id HAVING SUM(amount_minor) > 0 ORDER BY MIN(id)`,
      { workshopId, paymentId },
    );
  }

  /** What an invoice holds of each payment, in the order they came. */
  heldBy(workshopId: string, invoiceId: string): Promise<{ paymentId: string; amount_minor: number }[]> {
    return this.database.select(
      `SELECT payment_id AS paymentId, CAST(SUM(amount_minor) AS SIGNED) AS amount_minor FROM payment_shares
       WHERE workshop_id = :workshopId AND invoice_id = :invoiceId
       GROUP BY payment_id HAVING SUM(amount_minor) > 0 ORDER BY MIN(id)`,
      { workshopId, invoiceId },
    );
  }
}
