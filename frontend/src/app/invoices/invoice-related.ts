import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { Invoice, InvoiceSummary } from '#shared/invoices/invoice-schema';
import type { Payment } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { InvoiceCalls } from './invoice-calls';
import { paymentWayNames } from './invoice-names';
import { StandingMark } from './standing-mark';

interface Related {
  readonly payments: readonly Payment[];
  readonly creditNotes: readonly InvoiceSummary[];
  readonly credited: Invoice | undefined;
}

const nothing: Related = { payments: [], creditNotes: [], credited: undefined };

/** What was paid on an invoice and what credits it; of a credit note, the invoice it corrects. */
@Component({
  selector: 'app-invoice-related',
  imports: [RouterLink, StandingMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-related.html',
  styleUrl: './invoice-related.scss',
})
export class InvoiceRelated {
  private readonly calls = inject(InvoiceCalls);
  protected readonly formats = inject(Formats);

  readonly invoice = input.required<Invoice>();

  protected readonly wayNames = paymentWayNames;
  private readonly reading = resource({
    params: () => this.invoice(),
    loader: ({ params, abortSignal }) => this.read(params, abortSignal),
  });
  protected readonly related = computed(() => (this.reading.hasValue() ? this.reading.value() : nothing));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly paid = computed(() =>
    this.related().payments.flatMap((payment) =>
      payment.shares
        .filter(({ invoiceId }) => invoiceId === this.invoice().id)
        .map(({ amount_minor }) => ({ payment, amount_minor })),
    ),
  );

  /** When a letter left, and who sent it; a receipt leaves by itself. */
  protected toldOf({ at, byName }: Invoice['letters'][number]): string {
    const day = this.formats.dayOf(at);
    return byName === '' ? day : $localize`${day}:day:, ${byName}:name:`;
  }

  private async read({ id, clientId, kind, creditedInvoiceId }: Invoice, signal: AbortSignal): Promise<Related> {
    if (kind === 'credit-note') {
      const credited = creditedInvoiceId ? await this.calls.read(creditedInvoiceId, signal) : undefined;
      return { ...nothing, credited };
    }
    const [payments, notes] = await Promise.all([
      everyPage((cursor) => this.calls.payments(clientId, cursor, signal)),
      everyPage((cursor) => this.calls.list({ clientId, kind: 'credit-note', limit: 100 }, cursor, signal)),
    ]);
    return { ...nothing, payments, creditNotes: notes.filter((note) => note.creditedInvoiceId === id) };
  }
}

async function everyPage<T>(
  page: (cursor: string | undefined) => Promise<{ readonly items: readonly T[]; readonly next: string | null }>,
): Promise<T[]> {
  const items: T[] = [];
  let cursor: string | undefined;
  do {
    const answer = await page(cursor);
    items.push(...answer.items);
    cursor = answer.next ?? undefined;
  } while (cursor !== undefined);
  return items;
}
