import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { ages, type Age } from '#shared/invoices/owed-by-age';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../core/formats/formats';
import { RowSteps } from '../jobs';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { InvoiceCalls } from './invoice-calls';
import { ageNames } from './invoice-names';

/** What is owed today: client by client and by how long, the longest at the end, and what lies here to clients' credit. */
@Component({
  selector: 'app-owed-page',
  imports: [EmptyState, MatButton, RouterLink, RowSteps, Skeleton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './owed-page.html',
  styleUrl: './owed-page.scss',
})
export class OwedPage {
  private readonly calls = inject(InvoiceCalls);
  protected readonly formats = inject(Formats);

  protected readonly reading = resource({ loader: ({ abortSignal }) => this.calls.owed(abortSignal) });
  protected readonly owed = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly ages = ages.map((age) => ({ age, name: ageNames[age] }));
  protected readonly sums = computed(() => {
    const items = this.owed()?.items ?? [];
    const at = (age: Age) => sumMinor(items.map(({ byAge_minor }) => byAge_minor[age]));
    const overdue_minor = sumMinor(ages.filter((age) => age !== 'not-due').map(at));
    return {
      byAge: ages.map((age) => ({ age, amount_minor: at(age) })),
      overdue_minor,
      credit_minor: sumMinor(items.map(({ credit_minor }) => credit_minor)),
    };
  });
}
