import { ChangeDetectionStrategy, Component, computed, inject, input, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { readJournalList, readJournalWorkbook } from '#shared/invoices/owed-endpoints';
import { addressOf } from '../core/api/address-of';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { askedPeriod } from './asked-period';
import { InvoiceCalls, type Period } from './invoice-calls';
import { JournalBook } from './journal-book';
import { PeriodField } from './period-field';
import { workshopToday } from './workshop-today';

/** Everything that moved an account in a time, with the sums of each kind, and the same for the accountant. */
@Component({
  selector: 'app-journal-page',
  imports: [EmptyState, JournalBook, MatButton, PeriodField, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './journal-page.html',
  styleUrl: './journal-page.scss',
})
export class JournalPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);

  readonly from = input<string>();
  readonly to = input<string>();

  protected readonly today = workshopToday();
  protected readonly period = computed<Period>(() => askedPeriod(this.from(), this.to(), this.today()), {
    equal: (one, other) => one.from === other.from && one.to === other.to,
  });
  protected readonly reading = resource({
    params: () => (this.period().from <= this.period().to ? this.period() : undefined),
    loader: ({ params, abortSignal }) => this.calls.journal(params, abortSignal),
  });
  protected readonly journal = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly isEmpty = computed(() =>
    (this.journal()?.currencies ?? []).every(({ entries }) => entries.length === 0),
  );
  protected readonly workbook = computed(() => addressOf(readJournalWorkbook, { query: { ...this.period() } }));
  protected readonly values = computed(() => addressOf(readJournalList, { query: { ...this.period() } }));

  protected narrow(period: Period): void {
    void this.router.navigate([], { queryParams: period, replaceUrl: true });
  }
}
