import { v7 as newId } from 'uuid';
import { currencyDigits } from '#shared/money/currency-digits';
import type { UnknownPaymentEvent } from '#shared/invoices/payment-schema';
import { Rejection } from '#shared/problems/rejection';
import type { CardEvent, CardOrder, CardPayments } from '../platform/card-payments/card-payments';
import type { Database } from '../platform/database/database';
import type { SignedBody } from '../platform/http/call';
import type { CheckoutRepository } from './checkout-repository';
import type { InvoiceRow } from './invoice-model';
import type { CheckoutEntering } from './checkout-entering';
import { wordsOf, type InvoiceParts } from './invoice-parts';
import { mustBeIssuedInvoice } from './invoice-policy';
import type { CheckoutRow } from './payment-model';

interface Parts extends InvoiceParts {
  readonly database: Database;
  readonly checkouts: CheckoutRepository;
  readonly cards: CardPayments;
  readonly entering: CheckoutEntering;
}

/** Who begins a payment by card, and where they come back to. */
export interface Payer {
  readonly accessId: string;
  readonly name: string;
  readonly email: string;
  readonly returnUrl: (checkoutId: string) => string;
}

/** The service counts the ariary, of two decimals by ISO 4217, in whole ones; others than two decimals it counts by rules of its own. */
const isCharged = (currency: string): boolean => currencyDigits(currency) === 2 && currency !== 'MGA';

/** A payment that may go on, and those of the same invoice that nobody will make any more. */
interface Reserved {
  readonly checkout: CheckoutRow;
  readonly outdated: readonly CheckoutRow[];
}

/**
 * Payments by card: begun over what is open by our own record, and recorded once, whoever tells of them first. Nothing here runs in a
 * transaction of its caller: the service outside is asked between short ones, so that nobody waits for it who moves money.
 */
export class CheckoutService {
  constructor(private readonly parts: Parts) {}

  /** Whether a currency can be charged to a card here. */
  mayCharge(currency: string): boolean {
    return isCharged(currency);
  }

  get(workshopId: string, checkoutId: string): Promise<CheckoutRow> {
    return this.parts.checkouts.get(workshopId, checkoutId);
  }

  /** Begins a payment of what is open; one begun over the same amount goes on while its page stands, one over another amount is ended. */
  async begin(workshopId: string, invoiceId: string, payer: Payer): Promise<CheckoutRow> {
    for (const open of await this.parts.checkouts.openOf(workshopId, invoiceId)) {
      const known = await this.asked(open);
      if (known.state === 'paid') return known;
    }
    const { checkout, outdated } = await this.parts.database.transaction(() =>
      this.reserve(workshopId, invoiceId, payer),
    );
    for (const one of outdated) await this.giveUp(one);
    return checkout.sessionId === null ? this.open(checkout, payer) : checkout;
  }

  /** Asks the service where a payment stands and records what it says; the same way an event goes. */
  async ask(workshopId: string, checkoutId: string): Promise<CheckoutRow> {
    return this.asked(await this.parts.checkouts.get(workshopId, checkoutId));
  }

  /**
   * Takes a signed event once. What it tells is only where to look: the service itself says how things stand. It is noted as taken after
   * that, so that one that was cut short is taken when it comes again.
   */
  async take(signed: SignedBody): Promise<void> {
    const event = this.believed(signed);
    const { checkouts } = this.parts;
    if (await checkouts.isKnown(event.id)) return;
    const checkout = await this.about(event);
    if (checkout) await this.settle(checkout, event.sessionId);
    await checkouts.keepEvent({
      ...{ id: event.id, kind: event.kind, content: signed.bytes.toString('utf8') },
      ...{ receivedAt: this.parts.clock.now(), checkoutId: checkout?.id ?? null },
    });
  }

  /** Events that spoke of no payment known to any workshop, the newest first. */
  unknownEvents(): Promise<UnknownPaymentEvent[]> {
    return this.parts.checkouts.unknownEvents();
  }

  /** Events get lost, and the service ends what nobody pays within a day. */
  private async asked(checkout: CheckoutRow): Promise<CheckoutRow> {
    await this.settle(checkout);
    return this.parts.checkouts.get(checkout.workshopId, checkout.id);
  }

  private believed(signed: SignedBody): CardEvent {
    try {
      return this.parts.cards.event(signed, this.parts.clock.now());
    } catch {
      throw new Rejection('invalid', 'signature-wrong');
    }
  }

  private async about({ sessionId, intentId, checkoutId }: CardEvent): Promise<CheckoutRow | undefined> {
    const { checkouts } = this.parts;
    return (
      (sessionId === null ? undefined : await checkouts.bySession(sessionId)) ??
      (intentId === null ? undefined : await checkouts.byIntent(intentId)) ??
      (checkoutId === null || checkoutId === '' ? undefined : await checkouts.byId(checkoutId))
    );
  }

  /** Our row stands before the service is asked, so what is paid on it will be known; one that a crash left without a page is gone on with. */
  private async reserve(workshopId: string, invoiceId: string, payer: Payer): Promise<Reserved> {
    await this.parts.settings.hold(workshopId);
    const invoice = await this.parts.invoices.lock(workshopId, invoiceId);
    mustBeIssuedInvoice(invoice);
    if (invoice.openMinor <= 0) throw new Rejection('conflict', 'checkout-nothing-open');
    const { currency } = invoice;
    if (!isCharged(currency)) throw new Rejection('conflict', 'checkout-currency', { values: { currency } });
    const open = await this.parts.checkouts.openOf(workshopId, invoiceId);
    const same = open.find(({ amountMinor }) => amountMinor === invoice.openMinor);
    const checkout = same ?? (await this.insert(invoice, payer));
    return { checkout, outdated: open.filter(({ id }) => id !== checkout.id) };
  }

  private insert({ workshopId, id: invoiceId, openMinor, currency }: InvoiceRow, payer: Payer): Promise<CheckoutRow> {
    return this.parts.checkouts.insert(workshopId, {
      ...{ id: newId(), invoiceId, accessId: payer.accessId, state: 'open', amountMinor: openMinor, currency },
      ...{ sessionId: null, url: null, intentId: null, turn: 0, createdAt: this.parts.clock.now() },
    });
  }

  /** Opens the page a payment is made on. The same order sent twice, by two clicks or after a crash, opens one. */
  private async open(checkout: CheckoutRow, payer: Payer): Promise<CheckoutRow> {
    const { workshopId } = checkout;
    const invoice = await this.parts.invoices.get(workshopId, checkout.invoiceId);
    const order = await this.order(checkout, invoice, payer);
    const begun = await this.reached(() => this.parts.cards.begin(order));
    const kept = await this.parts.database.transaction(() => this.keepPage(checkout, begun, { invoice, payer }));
    if (kept.sessionId !== begun.sessionId) await this.end(begun.sessionId);
    return kept;
  }

  private async order(checkout: CheckoutRow, { number }: InvoiceRow, payer: Payer): Promise<CardOrder> {
    const { id, workshopId, amountMinor, currency } = checkout;
    const words = await wordsOf(this.parts, workshopId);
    return {
      ...{ checkoutId: id, amount_minor: amountMinor, currency, email: payer.email, returnUrl: payer.returnUrl(id) },
      title: words.say('paper-invoice-title', { kind: 'invoice', number: number ?? '' }),
    };
  }

  /** The first page that is known stays; another that somebody opened in the same moment is closed again. */
  private async keepPage(
    { workshopId, id }: CheckoutRow,
    begun: { readonly sessionId: string; readonly url: string },
    { invoice, payer }: { invoice: InvoiceRow; payer: Payer },
  ): Promise<CheckoutRow> {
    const checkout = await this.parts.checkouts.lock(workshopId, id);
    if (checkout.sessionId !== null || checkout.state !== 'open') return checkout;
    await this.parts.checkouts.write(workshopId, id, begun);
    await this.parts.audit.record(
      { workshopId, accountId: null, name: payer.name },
      {
        subject: { kind: 'invoice', id: invoice.id },
        ...(invoice.jobId ? { jobId: invoice.jobId } : {}),
        code: 'history-checkout-begun',
        values: { number: invoice.number ?? '' },
      },
    );
    return this.parts.checkouts.get(workshopId, id);
  }

  /** Ends a payment nobody will make any more; one that was made in this very moment is not lost, its event is still to come. */
  private async giveUp({ workshopId, id, sessionId }: CheckoutRow): Promise<void> {
    if (sessionId !== null) await this.end(sessionId);
    await this.parts.database.transaction(async () => {
      const { state } = await this.parts.checkouts.lock(workshopId, id);
      if (state === 'open') await this.parts.checkouts.write(workshopId, id, { state: 'expired', url: null });
    });
  }

  private async end(sessionId: string): Promise<void> {
    await this.parts.cards.end(sessionId).catch(() => undefined);
  }

  /**
   * The one way a payment by card enters the books, from an event or from asking. Two who ask at once may hear of different moments: an
   * answer asked for before the last change is not entered after it, but asked for again.
   */
  private async settle(found: CheckoutRow, toldSession: string | null = null): Promise<void> {
    const { workshopId, id } = found;
    const sessionId = found.sessionId ?? toldSession;
    if (sessionId === null) return;
    let isEntered = false;
    while (!isEntered) {
      const { turn } = await this.parts.checkouts.get(workshopId, id);
      const state = await this.reached(() => this.parts.cards.state(sessionId));
      isEntered = await this.parts.database.transaction(() =>
        this.parts.entering.enter({ workshopId, id, turn }, { ...state, sessionId }),
      );
    }
  }

  private async reached<T>(work: () => Promise<T>): Promise<T> {
    try {
      return await work();
    } catch {
      throw new Rejection('unavailable', 'checkout-unreachable', { retryAfter_seconds: 10 });
    }
  }
}
