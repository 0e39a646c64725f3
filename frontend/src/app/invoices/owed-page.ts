import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { InvoiceCalls } from './invoice-calls';
import { OwedBook } from './owed-book';

/** What is owed today, each currency by itself. */
@Component({
  selector: 'app-owed-page',
  imports: [EmptyState, MatButton, OwedBook, RouterLink, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './owed-page.html',
  styleUrl: './owed-page.scss',
})
export class OwedPage {
  private readonly calls = inject(InvoiceCalls);

  protected readonly reading = resource({ loader: ({ abortSignal }) => this.calls.owed(abortSignal) });
  protected readonly owed = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
}
