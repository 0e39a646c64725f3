import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  computed,
  effect,
  inject,
  input,
  linkedSignal,
  resource,
} from '@angular/core';
import { RouterLink } from '@angular/router';
import { MatButton } from '@angular/material/button';
import { askClientCheckout } from '#shared/client-page/client-invoices-endpoints';
import type { Checkout } from '#shared/invoices/payment-schema';
import { Api } from '../core/api/api';
import { Formats } from '../core/formats/formats';
import { Session } from '../core/session/session';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { ClientInvoiceStore } from './client-invoice-store';
import { ClientRefused } from './client-refused';

/** The service may still be settling the payment when one comes back: it is asked so many times more, with growing pauses. */
const pauses_ms = [2_000, 4_000, 8_000, 16_000, 30_000];

/** Where a client comes back to from paying. What it says is what the payment service itself says, whatever told us first. */
@Component({
  selector: 'app-client-payment-page',
  imports: [ClientFrame, ClientRefused, MatButton, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ClientInvoiceStore],
  templateUrl: './client-payment-page.html',
  styleUrl: './client-invoice-page.scss',
})
export class ClientPaymentPage {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  protected readonly store = inject(ClientInvoiceStore);
  protected readonly formats = inject(Formats);

  readonly checkoutId = input.required<string>();

  private readonly asking = resource({
    params: () => this.checkoutId(),
    loader: ({ params, abortSignal }) =>
      this.api.call(askClientCheckout, { params: { checkoutId: params }, signal: abortSignal }),
  });
  /** What was known last stays while it is asked again. */
  protected readonly checkout = linkedSignal<Checkout | undefined, Checkout | undefined>({
    source: () => (this.asking.hasValue() ? this.asking.value() : undefined),
    computation: (checkout, before) => checkout ?? before?.value,
  }).asReadonly();
  protected readonly problem = computed(() => (this.checkout() ? '' : (this.asking.error()?.message ?? '')));
  protected readonly number = computed(
    () => this.store.invoices()?.find(({ id }) => id === this.checkout()?.invoiceId)?.number ?? '',
  );
  protected readonly isAsking = computed(() => this.asking.isLoading());
  protected readonly amount = computed(() => {
    const checkout = this.checkout();
    return checkout ? this.formats.moneyIn(checkout.currency, checkout.amount_minor) : '';
  });
  private timesAsked = 0;
  private timer: ReturnType<typeof setTimeout> | undefined;

  constructor() {
    effect(() => this.session.visit(this.store.letterhead()));
    effect(() => {
      if (this.asking.hasValue() && this.asking.value().state === 'open') this.askLater();
    });
    inject(DestroyRef).onDestroy(() => clearTimeout(this.timer));
  }

  protected askAgain(): void {
    this.asking.reload();
  }

  private askLater(): void {
    const pause_ms = pauses_ms[this.timesAsked++];
    if (pause_ms === undefined) return;
    clearTimeout(this.timer);
    this.timer = setTimeout(() => this.asking.reload(), pause_ms);
  }
}
