import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import type { WordCode } from '#shared/words/word-code';
import type { Doer } from '../audit';
import type { CardState } from '../platform/card-payments/card-payments';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { OutsideDeed, PaymentRow } from './payment-model';
import type { PaymentService } from './payment-service';
import type { SettlingService } from './settling-service';

interface Parts extends InvoiceParts {
  readonly recording: PaymentService;
  readonly settling: SettlingService;
}

/** Money that leaves a payment. */
interface Given {
  readonly id?: string;
  readonly amount_minor: MinorUnits;
  readonly refundedOn: string;
  readonly reference: string;
  readonly externalId: string | null;
  readonly deed?: OutsideDeed;
  readonly follows?: string;
}

/** How much of a payment is away by one refund or dispute of the payment service. */
interface Away {
  readonly outsideId: string;
  readonly away_minor: MinorUnits;
  readonly kind: 'refund' | 'dispute';
}

/** Of a refund that waits nothing is known yet; one that failed is back, and so is what a dispute does not take, or gave back. */
function awaysOf(state: CardState): Away[] {
  const refunds = state.refunds
    .filter(({ standing }) => standing !== 'waiting')
    .map(({ id, amount_minor, standing }): Away => {
      return { outsideId: id, away_minor: standing === 'done' ? amount_minor : 0, kind: 'refund' };
    });
  const disputes = state.disputes.map(({ id, amount_minor, currency, isTaken }): Away => {
    // In a currency of the bank's own it says nothing in ours: all that is left of the payment is in dispute then.
    const amount = currency === state.currency ? amount_minor : state.amount_minor;
    return { outsideId: id, away_minor: isTaken ? amount : 0, kind: 'dispute' };
  });
  return [...refunds, ...disputes];
}

/** Money that goes back and comes back: each movement a row of its own beside the payment, and invoices open or paid again with it. */
export class MoneyBackService {
  constructor(private readonly parts: Parts) {}

  /** Takes money out of what lies to the client's credit, and beyond that out of what invoices hold, which are open again then. */
  async give(by: Doer, payment: PaymentRow, given: Given): Promise<PaymentRow> {
    const { workshopId } = payment;
    const { amount_minor, refundedOn } = given;
    const beyond_minor = Math.max(0, amount_minor - payment.creditMinor);
    if (beyond_minor > 0) await this.parts.settling.reopen(payment, beyond_minor);
    const { creditMinor } = await this.parts.payments.lock(workshopId, payment.id);
    await this.parts.payments.write(workshopId, payment.id, { creditMinor: creditMinor - amount_minor });
    const row = await this.add(by, payment, { ...given, amount_minor: -amount_minor, receivedOn: refundedOn });
    await this.record(by, row, given.deed === 'dispute' ? 'history-dispute-took' : 'history-refunded');
    return row;
  }

  /**
   * Brings the books to where the payment service says that a payment stands, whatever it told before and in whatever order; says whether
   * anything moved. The payment's rows are held by the caller.
   */
  async follow(by: Doer, payment: PaymentRow, state: CardState): Promise<boolean> {
    let hasMoved = false;
    for (const away of awaysOf(state)) hasMoved = (await this.followOne(by, payment, away)) || hasMoved;
    return hasMoved;
  }

  private async followOne(by: Doer, { workshopId, id }: PaymentRow, away: Away): Promise<boolean> {
    const payment = await this.parts.payments.lock(workshopId, id);
    const known = await this.parts.payments.following(workshopId, away.outsideId);
    const known_minor = sumMinor(known.map(({ amountMinor }) => -amountMinor));
    const before = await this.parts.payments.refundsOf(workshopId, id);
    const left_minor = sumMinor([payment.amountMinor, ...before.map(({ amountMinor }) => amountMinor)]);
    const wanted_minor = Math.min(away.away_minor, known_minor + left_minor);
    if (wanted_minor > known_minor)
      await this.takeAway(by, payment, { ...away, away_minor: wanted_minor - known_minor });
    if (wanted_minor < known_minor) await this.takeIn(by, payment, { ...away, away_minor: known_minor - wanted_minor });
    return wanted_minor !== known_minor;
  }

  private async takeAway(by: Doer, payment: PaymentRow, { kind, outsideId, away_minor }: Away): Promise<void> {
    const refundedOn = await todayIn(this.parts, payment.workshopId);
    const named =
      kind === 'refund'
        ? { externalId: outsideId }
        : { externalId: null, deed: 'dispute' as const, follows: outsideId };
    await this.give(by, payment, { amount_minor: away_minor, refundedOn, reference: '', ...named });
  }

  private async takeIn(by: Doer, payment: PaymentRow, { kind, outsideId, away_minor }: Away): Promise<void> {
    const { workshopId, id, creditMinor } = payment;
    const deed = kind === 'refund' ? 'refund-failed' : 'dispute';
    const receivedOn = await todayIn(this.parts, workshopId);
    const named = { deed, follows: outsideId, externalId: null, reference: '' } as const;
    const row = await this.add(by, payment, { ...named, amount_minor: away_minor, receivedOn });
    await this.parts.payments.write(workshopId, id, { creditMinor: creditMinor + away_minor });
    await this.parts.settling.restore(await this.parts.payments.lock(workshopId, id), away_minor);
    await this.record(by, row, kind === 'refund' ? 'history-refund-failed' : 'history-dispute-gave');
  }

  private add(
    by: Doer,
    { id: refundsPaymentId, clientId, way, currency, reference: paid }: PaymentRow,
    given: Omit<Given, 'refundedOn'> & { readonly receivedOn: string },
  ): Promise<PaymentRow> {
    const { id, amount_minor, receivedOn, reference, externalId, deed = null, follows = null } = given;
    return this.parts.recording.add(by, {
      ...(id === undefined ? {} : { id }),
      ...{ clientId, way, currency, amountMinor: amount_minor, creditMinor: 0, receivedOn },
      // What nobody here has entered is named by the payment it belongs to.
      ...{ reference: deed === null ? reference : paid, refundsPaymentId, externalId, deed, follows },
    });
  }

  private async record(by: Doer, { workshopId, id, clientId, amountMinor }: PaymentRow, code: WordCode): Promise<void> {
    const client = await this.parts.jobs.client(workshopId, clientId);
    const values = { amount_minor: Math.abs(amountMinor), client: client.name };
    await this.parts.audit.record(by, { subject: { kind: 'payment', id }, code, values });
  }
}
