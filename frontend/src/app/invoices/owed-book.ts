import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import { ages, type Age } from '#shared/invoices/owed-by-age';
import type { OwedInCurrency } from '#shared/invoices/payment-schema';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../core/formats/formats';
import { RowSteps } from '../jobs';
import { ageNames } from './invoice-names';

/** What is owed in one currency: client by client and by how long, the longest at the end, and what lies here to clients' credit. */
@Component({
  selector: 'app-owed-book',
  imports: [RouterLink, RowSteps],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './owed-book.html',
  styleUrl: './owed-book.scss',
})
export class OwedBook {
  protected readonly formats = inject(Formats);

  readonly book = input.required<OwedInCurrency>();
  readonly day = input.required<string>();
  /** Where there are several, each is named by its currency. */
  readonly isNamed = input(false);

  protected readonly ages = ages.map((age) => ({ age, name: ageNames[age] }));
  protected readonly sums = computed(() => {
    const { items } = this.book();
    const at = (age: Age) => sumMinor(items.map(({ byAge_minor }) => byAge_minor[age]));
    const overdue_minor = sumMinor(ages.filter((age) => age !== 'not-due').map(at));
    return {
      byAge: ages.map((age) => ({ age, amount_minor: at(age) })),
      overdue_minor,
      credit_minor: sumMinor(items.map(({ credit_minor }) => credit_minor)),
    };
  });

  protected money(amount_minor: number): string {
    return this.formats.moneyIn(this.book().currency, amount_minor);
  }

  protected amount(amount_minor: number): string {
    return this.formats.amountIn(this.book().currency, amount_minor);
  }
}
