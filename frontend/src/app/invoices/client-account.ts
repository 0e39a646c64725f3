import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { RouterLink } from '@angular/router';
import { byCurrency } from '#shared/invoices/by-currency';
import type { Client } from '#shared/jobs/client-schema';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../core/formats/formats';
import { InvoiceCalls } from './invoice-calls';
import { openInvoicesOf } from './open-invoices-of';
import { StandingMark } from './standing-mark';

/** What a client owes, on their page: each open invoice, and the way to their statement. */
@Component({
  selector: 'app-client-account',
  imports: [RouterLink, StandingMark],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <h2 i18n>Account</h2>
    @if (invoices(); as open) {
      @if (open.length === 0) {
        <p class="muted" i18n>Nothing is owed.</p>
      } @else {
        <ul class="plain">
          @for (invoice of open; track invoice.id) {
            <li>
              <span class="row">
                <a [routerLink]="['/accounts/invoices', invoice.id]">{{ invoice.number }}</a>
                <app-standing-mark [invoice]="invoice" />
                @if (invoice.dueOn; as day) {
                  <span class="muted" i18n>due {{ formats.day(day) }}</span>
                }
              </span>
              <span>{{ formats.moneyIn(invoice.currency, invoice.open_minor) }}</span>
            </li>
          }
        </ul>
        @if (open.length > 1) {
          @for (sum of owed(); track sum) {
            <p class="sum">
              <span i18n>Owed together</span> <span>{{ sum }}</span>
            </p>
          }
        }
      }
    }
    <p><a [routerLink]="['/accounts/clients', client().id]" i18n>Their statement</a></p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
    }

    li,
    .sum {
      display: flex;
      gap: 16px;
      align-items: center;
      justify-content: space-between;
      min-height: 40px;
      border-bottom: 1px solid var(--line);
    }

    .sum {
      max-width: none;
      border: 0;
      font-weight: 500;
    }
  `,
})
export class ClientAccount {
  private readonly calls = inject(InvoiceCalls);
  protected readonly formats = inject(Formats);

  readonly client = input.required<Client>();

  private readonly reading = resource({
    params: () => this.client().id,
    loader: ({ params, abortSignal }) => openInvoicesOf(this.calls, params, abortSignal),
  });
  protected readonly invoices = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly owed = computed(() =>
    byCurrency(this.invoices() ?? [], this.formats.currency()).map(({ currency, rows }) =>
      this.formats.moneyIn(currency, sumMinor(rows.map(({ open_minor }) => open_minor))),
    ),
  );
}
