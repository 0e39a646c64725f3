import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { RouterLink } from '@angular/router';
import type { Statement } from '#shared/invoices/payment-schema';
import { Formats } from '../core/formats/formats';
import { ledgerEntryNames } from './invoice-names';

/** The account of one client in one currency: what was owed before, and every movement with what was owed after it. */
@Component({
  selector: 'app-statement-account',
  imports: [RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './statement-account.html',
  styleUrl: './statement-account.scss',
})
export class StatementAccount {
  protected readonly formats = inject(Formats);

  readonly account = input.required<Statement['currencies'][number]>();
  readonly from = input.required<string>();
  readonly to = input.required<string>();

  protected readonly entryNames = ledgerEntryNames;

  protected money(amount_minor: number): string {
    return this.formats.moneyIn(this.account().currency, amount_minor);
  }

  protected amount(amount_minor: number): string {
    return this.formats.amountIn(this.account().currency, amount_minor);
  }
}
