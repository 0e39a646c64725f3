import { DOCUMENT, ChangeDetectionStrategy, Component, computed, effect, inject, input, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { beginClientCheckout, readClientInvoicePaper } from '#shared/client-page/client-invoices-endpoints';
import { addressOf } from '../core/api/address-of';
import { Api } from '../core/api/api';
import { Formats } from '../core/formats/formats';
import { ProblemError } from '../core/problems/problem-error';
import { PageTitle } from '../core/routing/page-title';
import { Session } from '../core/session/session';
import { Skeleton } from '../ui/page/skeleton';
import { ClientFrame } from './client-frame';
import { ClientInvoiceStore } from './client-invoice-store';
import { ClientRefused } from './client-refused';

/** An invoice as its client sees it: what it comes to, what is open, its papers, and paying it by card. */
@Component({
  selector: 'app-client-invoice-page',
  imports: [ClientFrame, ClientRefused, MatButton, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [ClientInvoiceStore],
  templateUrl: './client-invoice-page.html',
  styleUrl: './client-invoice-page.scss',
})
export class ClientInvoicePage {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly document = inject(DOCUMENT);
  private readonly title = inject(PageTitle, { optional: true });
  protected readonly store = inject(ClientInvoiceStore);
  protected readonly formats = inject(Formats);

  readonly invoiceId = input.required<string>();

  protected readonly isPaying = signal(false);
  protected readonly refusal = signal('');
  protected readonly invoice = computed(() => this.store.invoices()?.find(({ id }) => id === this.invoiceId()));
  /** Everything has come, and this invoice is not among it. */
  protected readonly isAbsent = computed(() => this.store.invoices() !== undefined && this.invoice() === undefined);
  protected readonly job = computed(
    () => this.store.jobs().find(({ id }) => id === this.invoice()?.jobId)?.title ?? '',
  );
  protected readonly pdf = computed(() => this.paper('invoice.pdf'));
  protected readonly xml = computed(() =>
    this.invoice()?.papers.includes('invoice.xml') ? this.paper('invoice.xml') : '',
  );

  constructor() {
    effect(() => this.session.visit(this.store.letterhead()));
    effect(() => {
      const invoice = this.invoice();
      if (!invoice) return;
      const { kind, number } = invoice;
      this.title?.name(
        kind === 'invoice' ? $localize`Invoice ${number}:number:` : $localize`Credit note ${number}:number:`,
      );
    });
  }

  /** The amount is the workshop's own record; the card is entered at the payment service, never here. */
  protected async pay(): Promise<void> {
    if (this.isPaying()) return;
    this.isPaying.set(true);
    this.refusal.set('');
    try {
      const { url } = await this.api.call(beginClientCheckout, { params: { invoiceId: this.invoiceId() } });
      if (url) this.document.location.assign(url);
      else this.store.reload();
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.refusal.set(error.message);
      this.store.reload();
    }
    this.isPaying.set(false);
  }

  private paper(paper: 'invoice.pdf' | 'invoice.xml'): string {
    return addressOf(readClientInvoicePaper, { params: { invoiceId: this.invoiceId(), paper } });
  }
}
