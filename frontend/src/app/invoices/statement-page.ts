import { ChangeDetectionStrategy, Component, computed, effect, inject, input, resource, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { readStatementPaper } from '#shared/invoices/owed-endpoints';
import { addressOf } from '../core/api/address-of';
import { PageTitle } from '../core/routing/page-title';
import { Session } from '../core/session/session';
import { EmptyState } from '../ui/page/empty-state';
import { PageHeader } from '../ui/page/page-header';
import { Skeleton } from '../ui/page/skeleton';
import { InvoiceCalls, type Period } from './invoice-calls';
import { NotedLetterForm } from './noted-letter-form';
import { PeriodField } from './period-field';
import { yearOf } from './month-of';
import { StatementAccount } from './statement-account';
import { workshopToday } from './workshop-today';

/** The account of one client: what was owed before, every movement with what was owed after it, and the same as a paper. */
@Component({
  selector: 'app-statement-page',
  imports: [EmptyState, MatButton, NotedLetterForm, PageHeader, PeriodField, RouterLink, Skeleton, StatementAccount],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './statement-page.html',
  styleUrl: './statement-page.scss',
})
export class StatementPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly router = inject(Router);
  private readonly session = inject(Session);
  private readonly title = inject(PageTitle, { optional: true });

  readonly clientId = input.required<string>();
  readonly from = input<string>();
  readonly to = input<string>();

  protected readonly today = workshopToday();
  /** The year so far: what came before it stands in the first line. */
  protected readonly period = computed<Period>(
    () => ({ from: this.from() ?? yearOf(this.today()).from, to: this.to() ?? yearOf(this.today()).to }),
    { equal: (one, other) => one.from === other.from && one.to === other.to },
  );
  protected readonly reading = resource({
    params: () =>
      this.period().from <= this.period().to ? { clientId: this.clientId(), period: this.period() } : undefined,
    loader: ({ params, abortSignal }) => this.calls.statement(params.clientId, params.period, abortSignal),
  });
  protected readonly statement = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly paper = computed(() =>
    addressOf(readStatementPaper, { params: { clientId: this.clientId() }, query: { ...this.period() } }),
  );

  protected readonly mayMail = computed(() => this.session.may('owner', 'office'));
  protected readonly isMailing = signal(false);
  protected readonly mail = (note: string, key: string) =>
    this.calls.mailStatement(this.clientId(), { ...this.period(), note }, key);

  constructor() {
    effect(() => {
      const statement = this.statement();
      if (statement) this.title?.name(statement.clientName);
    });
  }

  protected narrow(period: Period): void {
    void this.router.navigate([], { queryParams: period, replaceUrl: true });
  }
}
