import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { readJournalList, readJournalWorkbook } from '#shared/invoices/owed-endpoints';
import { sumMinor } from '#shared/money/sum-minor';
import { addressOf } from '../core/api/address-of';
import { Formats } from '../core/formats/formats';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { askedPeriod } from './asked-period';
import { InvoiceCalls, type Period } from './invoice-calls';
import { ledgerEntryNames, ledgerKindNames } from './invoice-names';
import { PeriodField } from './period-field';
import { workshopToday } from './workshop-today';

/** Everything that moved an account in a time, with the sums of each kind, and the same for the accountant. */
@Component({
  selector: 'app-journal-page',
  imports: [EmptyState, MatButton, PeriodField, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './journal-page.html',
  styleUrl: './journal-page.scss',
})
export class JournalPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  protected readonly formats = inject(Formats);

  readonly from = input<string>();
  readonly to = input<string>();

  protected readonly today = workshopToday();
  protected readonly kindNames = ledgerKindNames;
  protected readonly entryNames = ledgerEntryNames;
  protected readonly period = computed<Period>(() => askedPeriod(this.from(), this.to(), this.today()), {
    equal: (one, other) => one.from === other.from && one.to === other.to,
  });
  protected readonly reading = resource({
    params: () => (this.period().from <= this.period().to ? this.period() : undefined),
    loader: ({ params, abortSignal }) => this.calls.journal(params, abortSignal),
  });
  protected readonly journal = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly totals = computed(() => (this.journal()?.totals ?? []).filter(({ count }) => count > 0));
  protected readonly sum = computed(() => ({
    net_minor: sumMinor(this.totals().map(({ net_minor }) => net_minor)),
    tax_minor: sumMinor(this.totals().map(({ tax_minor }) => tax_minor)),
    rounding_minor: sumMinor(this.totals().map(({ rounding_minor }) => rounding_minor)),
    amount_minor: sumMinor(this.totals().map(({ amount_minor }) => amount_minor)),
  }));
  protected readonly isRounded = computed(() => this.totals().some(({ rounding_minor }) => rounding_minor !== 0));
  protected readonly workbook = computed(() => addressOf(readJournalWorkbook, { query: { ...this.period() } }));
  protected readonly values = computed(() => addressOf(readJournalList, { query: { ...this.period() } }));

  protected narrow(period: Period): void {
    void this.router.navigate([], { queryParams: period, replaceUrl: true });
  }

  /** An amount that is none is left out, so that what matters stands free. */
  protected amount(amount_minor: number): string {
    return amount_minor === 0 ? '' : this.formats.amount(amount_minor);
  }
}
