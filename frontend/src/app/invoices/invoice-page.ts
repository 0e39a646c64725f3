import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { PageTitle } from '../core/routing/page-title';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { SavingIndicator } from '../ui/page/saving-indicator';
import { Skeleton } from '../ui/page/skeleton';
import { InvoiceDraft } from './invoice-draft';
import { invoiceKindNames } from './invoice-names';
import { InvoiceStore } from './invoice-store';
import { InvoiceView } from './invoice-view';
import { StandingMark } from './standing-mark';

/** One invoice or credit note: written while it is a draft, read once it is issued. */
@Component({
  selector: 'app-invoice-page',
  imports: [
    ...[EmptyState, InvoiceDraft, InvoiceView, MatButton, PageHeader, RouterLink, SavingIndicator],
    ...[Skeleton, StandingMark],
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [InvoiceStore],
  template: `
    @if (store.invoice(); as invoice) {
      <app-page-header [heading]="heading()" [about]="invoice.clientName">
        <app-standing-mark marks [invoice]="invoice" />
        @if (invoice.state === 'draft') {
          <app-saving-indicator />
        }
      </app-page-header>
      @if (invoice.state === 'issued') {
        <app-invoice-view [invoice]="invoice" (changed)="store.reload()" />
      } @else if (mayWrite()) {
        <app-invoice-draft [invoice]="invoice" />
      } @else {
        <app-invoice-view [invoice]="invoice" (changed)="store.reload()" />
      }
    } @else if (store.problem()) {
      <div class="page">
        <app-empty-state icon="accounts" i18n-heading heading="The invoice did not come" [text]="store.problem()">
          <button matButton="outlined" type="button" (click)="store.reload()" i18n>Ask again</button>
          <a matButton routerLink="/accounts/invoices" i18n>To the invoices</a>
        </app-empty-state>
      </div>
    } @else {
      <div class="page"><app-skeleton [lines]="10" /></div>
    }
  `,
})
export class InvoicePage {
  protected readonly store = inject(InvoiceStore);
  private readonly session = inject(Session);
  private readonly title = inject(PageTitle, { optional: true });

  readonly invoiceId = input.required<string>();

  protected readonly mayWrite = computed(() => this.session.may('owner', 'office'));
  protected readonly heading = computed(() => {
    const invoice = this.store.invoice();
    if (!invoice) return '';
    const kind = invoiceKindNames[invoice.kind];
    return invoice.number ? `${kind} ${invoice.number}` : kind;
  });

  constructor() {
    effect(() => this.store.open(this.invoiceId()));
    effect(() => {
      if (this.heading()) this.title?.name(this.heading());
    });
  }
}
