import { v7 as newId } from 'uuid';
import { paymentShares, releasedShares, type Share } from '#shared/invoices/payment-shares';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import type { Clock } from '../platform/clock/clock';
import type { InvoiceRow } from './invoice-model';
import type { InvoiceRepository } from './invoice-repository';
import type { PaymentRow } from './payment-model';
import type { PaymentRepository } from './payment-repository';

interface Parts {
  readonly invoices: InvoiceRepository;
  readonly payments: PaymentRepository;
  readonly clock: Clock;
}

/** What of an invoice was given up, in minor units. */
export async function writtenOffOf(
  payments: PaymentRepository,
  workshopId: string,
  invoiceId: string,
): Promise<MinorUnits> {
  return sumMinor((await payments.writeOffsOf(workshopId, invoiceId)).map(({ amountMinor }) => amountMinor));
}

/**
 * The only place where what is open moves. Whatever it does, what is due − credited − paid − written off stays what is open of an
 * invoice, and what a payment's invoices hold + its credit + what was given back stays what was paid. Rows are held by its callers.
 */
export class SettlingService {
  constructor(private readonly parts: Parts) {}

  /** Puts shares of a payment to invoices; both have been looked at before. */
  async share(payment: PaymentRow, shares: readonly Share[]): Promise<void> {
    const { workshopId } = payment;
    for (const { invoiceId, amount_minor } of shares) {
      await this.addShare(payment, invoiceId, amount_minor);
      const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
      await this.parts.invoices.write(workshopId, invoiceId, { openMinor: invoice.openMinor - amount_minor });
    }
    const taken_minor = sumMinor(shares.map(({ amount_minor }) => amount_minor));
    await this.parts.payments.write(workshopId, payment.id, { creditMinor: payment.creditMinor - taken_minor });
  }

  /** Takes an amount back from the invoices that hold a payment, the newest share first: they are open again, and it is credit. */
  async reopen(payment: PaymentRow, amount_minor: MinorUnits): Promise<void> {
    const { workshopId, id } = payment;
    const { shares } = releasedShares(amount_minor, await this.parts.payments.heldOf(workshopId, id));
    for (const { invoiceId, amount_minor: back_minor } of shares) {
      await this.addShare(payment, invoiceId, -back_minor);
      const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
      await this.parts.invoices.write(workshopId, invoiceId, { openMinor: invoice.openMinor + back_minor });
    }
    const freed_minor = sumMinor(shares.map((share) => share.amount_minor));
    await this.parts.payments.write(workshopId, id, { creditMinor: payment.creditMinor + freed_minor });
  }

  /** Puts credit of a payment back to the invoices it was taken from, as far as they are open; what none takes stays credit. */
  async restore(payment: PaymentRow, amount_minor: MinorUnits): Promise<void> {
    const { workshopId, id } = payment;
    const open: { invoiceId: string; open_minor: MinorUnits }[] = [];
    for (const invoiceId of await this.parts.payments.reopenedBy(workshopId, id))
      open.push({ invoiceId, open_minor: (await this.parts.invoices.lock(workshopId, invoiceId)).openMinor });
    await this.share(payment, paymentShares(amount_minor, open).shares);
  }

  /** A credit note takes from what is open; what was paid beyond that becomes credit of the payments it came from. */
  async credit(invoice: InvoiceRow, credit_minor: MinorUnits): Promise<void> {
    const { workshopId, id } = invoice;
    const beyond_minor = Math.max(0, credit_minor - invoice.openMinor);
    await this.free(invoice, beyond_minor);
    await this.parts.invoices.write(workshopId, id, {
      openMinor: invoice.openMinor + beyond_minor - credit_minor,
      creditedMinor: invoice.creditedMinor + credit_minor,
    });
  }

  private async free(invoice: InvoiceRow, amount_minor: MinorUnits): Promise<void> {
    const { workshopId, id } = invoice;
    const held = await this.parts.payments.heldBy(workshopId, id);
    const shares = held.map((one) => ({ invoiceId: one.paymentId, amount_minor: one.amount_minor }));
    for (const { invoiceId: paymentId, amount_minor: freed_minor } of releasedShares(amount_minor, shares).shares) {
      const payment = await this.parts.payments.lock(workshopId, paymentId);
      await this.addShare(payment, id, -freed_minor);
      await this.parts.payments.write(workshopId, paymentId, { creditMinor: payment.creditMinor + freed_minor });
    }
  }

  private async addShare({ workshopId, id }: PaymentRow, invoiceId: string, amountMinor: MinorUnits): Promise<void> {
    const at = this.parts.clock.now();
    await this.parts.payments.shares.insert(workshopId, { id: newId(), paymentId: id, invoiceId, amountMinor, at });
  }
}
