import { ChangeDetectionStrategy, Component, inject, signal, computed } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import type { Payment } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { ListBody } from '../jobs';
import { EmptyState } from '../ui/page/empty-state';
import { InvoiceCalls } from './invoice-calls';
import { movementName, paymentWayNames } from './invoice-names';
import { PaymentRefund } from './payment-refund';
import { PaymentSharing } from './payment-sharing';
import { UnknownEvents } from './unknown-events';

interface Opened {
  readonly paymentId: string;
  readonly deed: 'refund' | 'share';
}

/** Payments and refunds, the newest first, each with the invoices it is for and what of it lies to the client's credit. */
@Component({
  selector: 'app-payments-page',
  imports: [EmptyState, ListBody, MatButton, PaymentRefund, PaymentSharing, RouterLink, UnknownEvents],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './payments-page.html',
  styleUrl: './payments-page.scss',
})
export class PaymentsPage {
  private readonly calls = inject(InvoiceCalls);
  protected readonly formats = inject(Formats);

  protected readonly wayNames = paymentWayNames;
  protected readonly movementName = movementName;
  protected readonly opened = signal<Opened | undefined>(undefined);
  private readonly asked = computed(() => ({}));
  protected readonly list = new PagedList<object, Payment>(this.asked, (_, cursor, signal) =>
    this.calls.payments(undefined, cursor, signal),
  );

  protected isOpen(payment: Payment, deed: Opened['deed']): boolean {
    const opened = this.opened();
    return opened?.paymentId === payment.id && opened.deed === deed;
  }

  protected done(): void {
    this.opened.set(undefined);
    this.list.reload();
  }
}
