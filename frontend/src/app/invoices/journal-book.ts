import { NgTemplateOutlet } from '@angular/common';
import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { JournalInCurrency } from '#shared/invoices/payment-schema';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../core/formats/formats';
import { ledgerEntryNames, ledgerKindNames, paymentWayNames } from './invoice-names';

type Paid = NonNullable<JournalInCurrency['entries'][number]['paid']>;

/** Everything that moved an account in one currency, with the sums of each kind before it. */
@Component({
  selector: 'app-journal-book',
  imports: [NgTemplateOutlet, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './journal-book.html',
  styleUrl: './journal-book.scss',
})
export class JournalBook {
  protected readonly formats = inject(Formats);

  readonly book = input.required<JournalInCurrency>();

  protected readonly kindNames = ledgerKindNames;
  protected readonly entryNames = ledgerEntryNames;
  protected readonly totals = computed(() => this.book().totals.filter(({ count }) => count > 0));
  protected readonly sum = computed(() => ({
    net_minor: sumMinor(this.totals().map(({ net_minor }) => net_minor)),
    tax_minor: sumMinor(this.totals().map(({ tax_minor }) => tax_minor)),
    rounding_minor: sumMinor(this.totals().map(({ rounding_minor }) => rounding_minor)),
    amount_minor: sumMinor(this.totals().map(({ amount_minor }) => amount_minor)),
  }));
  protected readonly isRounded = computed(() => this.totals().some(({ rounding_minor }) => rounding_minor !== 0));

  protected paidBy({ way, invoices }: Paid): string {
    const name = paymentWayNames[way];
    return invoices.length === 0 ? name : $localize`${name}:way:, for ${invoices.join(', ')}:invoices:`;
  }

  protected full(amount_minor: number): string {
    return this.formats.amountIn(this.book().currency, amount_minor);
  }

  /** An amount that is none is left out, so that what matters stands free. */
  protected amount(amount_minor: number): string {
    return amount_minor === 0 ? '' : this.full(amount_minor);
  }
}
