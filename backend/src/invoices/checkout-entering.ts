import { paymentShares } from '#shared/invoices/payment-shares';
import type { Doer } from '../audit';
import type { CardState } from '../platform/card-payments/card-payments';
import type { CheckoutRepository } from './checkout-repository';
import type { ReceiptLetters } from './invoice-letters';
import type { InvoiceRow } from './invoice-model';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { MoneyBackService } from './money-back-service';
import type { CheckoutRow, PaymentRow } from './payment-model';
import type { PaymentService } from './payment-service';
import type { SettlingService } from './settling-service';

interface Parts extends InvoiceParts {
  readonly checkouts: CheckoutRepository;
  readonly recording: PaymentService;
  readonly moneyBack: MoneyBackService;
  readonly settling: SettlingService;
  readonly letters: ReceiptLetters;
}

/** Which payment is meant, as it stood when the service was asked. */
type Asked = Pick<CheckoutRow, 'workshopId' | 'id' | 'turn'>;
type Said = CardState & { readonly sessionId: string };

/** Enters into the books what the payment service says of a payment by card, all in the transaction of the caller. */
export class CheckoutEntering {
  constructor(private readonly parts: Parts) {}

  /** False where something has changed since the service was asked: what it said then is not entered. */
  async enter({ workshopId, id, turn }: Asked, said: Said): Promise<boolean> {
    await this.parts.settings.hold(workshopId);
    const checkout = await this.parts.checkouts.lock(workshopId, id);
    if (checkout.turn !== turn) return false;
    const isNamed = await this.name(checkout, said);
    const hasMoved = said.status === 'paid' ? await this.enterPaid(checkout, said) : await this.close(checkout, said);
    if (isNamed || hasMoved) await this.parts.checkouts.write(workshopId, id, { turn: turn + 1 });
    return true;
  }

  private async name(checkout: CheckoutRow, { intentId, sessionId }: Said): Promise<boolean> {
    if (intentId === null || checkout.intentId !== null) return false;
    await this.parts.checkouts.write(checkout.workshopId, checkout.id, { intentId, sessionId });
    return true;
  }

  private async close({ workshopId, id, state }: CheckoutRow, { status }: Said): Promise<boolean> {
    if (state !== 'open' || status === 'open') return false;
    await this.parts.checkouts.write(workshopId, id, { state: status, url: null });
    return true;
  }

  private async enterPaid(checkout: CheckoutRow, said: Said): Promise<boolean> {
    const { workshopId } = checkout;
    const { intentId } = said;
    if (said.amount_minor !== checkout.amountMinor || said.currency !== checkout.currency || intentId === null)
      throw new Error(`checkout ${checkout.id} was paid over another amount than it was begun over`);
    const invoice = await this.parts.invoices.lock(workshopId, checkout.invoiceId);
    const by = { workshopId, accountId: null, name: invoice.content.buyer.name };
    const known = await this.parts.payments.byExternal(workshopId, intentId);
    const payment = known ?? (await this.enterPayment(by, { checkout, invoice, intentId }));
    const hasMoved = await this.parts.moneyBack.follow(by, payment, said);
    return hasMoved || known === undefined;
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
}
