import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import { Formats } from '../core/formats/formats';
import { PagedList } from '../core/lists/paged-list';
import { ListBody, RowSteps } from '../jobs';
import { EmptyState } from '../ui/page/empty-state';
import { InvoiceCalls, type InvoicesAsked } from './invoice-calls';
import { invoiceKindNames } from './invoice-names';
import { StandingMark } from './standing-mark';

const narrowings = {
  all: {},
  drafts: { state: 'draft' },
  open: { open: 'yes' },
  issued: { state: 'issued', kind: 'invoice' },
  credits: { state: 'issued', kind: 'credit-note' },
} as const satisfies Readonly<Record<string, InvoicesAsked>>;
type Narrowing = keyof typeof narrowings;

/** Invoices and credit notes, the newest first: drafts, what is open, all that was issued. */
@Component({
  selector: 'app-invoices-page',
  imports: [EmptyState, ListBody, MatButton, RouterLink, RowSteps, StandingMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoices-page.html',
  styleUrl: './invoices-page.scss',
})
export class InvoicesPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  protected readonly formats = inject(Formats);

  readonly show = input<string>();

  protected readonly chosen = computed<Narrowing>(() => {
    const show = this.show() ?? '';
    return Object.hasOwn(narrowings, show) ? (show as Narrowing) : 'all';
  });
  protected readonly choices: readonly { readonly value: Narrowing; readonly name: string }[] = [
    { value: 'all', name: $localize`All` },
    { value: 'drafts', name: $localize`Drafts` },
    { value: 'open', name: $localize`Open` },
    { value: 'issued', name: $localize`Issued invoices` },
    { value: 'credits', name: $localize`Credit notes` },
  ];
  protected readonly kindNames = invoiceKindNames;
  private readonly asked = computed<InvoicesAsked>(() => narrowings[this.chosen()]);
  protected readonly list = new PagedList<InvoicesAsked, InvoiceSummary>(this.asked, (asked, cursor, signal) =>
    this.calls.list(asked, cursor, signal),
  );

  protected narrow(show: Narrowing): void {
    const queryParams = { show: show === 'all' ? null : show };
    void this.router.navigate([], { queryParams, replaceUrl: true });
  }
}
