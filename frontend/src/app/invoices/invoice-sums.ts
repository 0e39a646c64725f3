import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { InvoiceKind } from '#shared/invoices/invoice';
import { isRated } from '#shared/money/is-rated';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';
import type { InvoiceAmounts } from './draft-amounts';
import { taxCodeNames } from '../core/formats/tax-code-names';

/** What an invoice comes to: net, tax by category, gross, and what is to be paid of it. */
@Component({
  selector: 'app-invoice-sums',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (row of rows(); track row.name) {
        <div>
          <dt>{{ row.name }}</dt>
          <dd>{{ row.amount }}</dd>
        </div>
      }
      <div class="due">
        <dt>{{ dueName() }}</dt>
        <dd>{{ due() }}</dd>
      </div>
    </dl>
  `,
  styles: `
    dl {
      margin: 0;
    }

    dl > div {
      display: flex;
      gap: 16px;
      justify-content: space-between;
      padding: 5px 0;
      border-bottom: 1px solid var(--line);
    }

    dt {
      color: var(--muted);
    }

    dd {
      margin: 0;
      white-space: nowrap;
    }

    dl > .due {
      align-items: baseline;
      padding-top: 10px;
      border: 0;
    }

    .due dt {
      color: var(--ink);
      font-weight: 500;
    }

    .due dd {
      font: 500 1.5rem/2rem var(--heading);
    }
  `,
})
export class InvoiceSums {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly amounts = input.required<InvoiceAmounts>();
  readonly currency = input.required<string>();
  readonly kind = input.required<InvoiceKind>();

  protected readonly due = computed(() => this.money(this.amounts().totals.due_minor));
  protected readonly dueName = computed(() => this.words.say('paper-invoice-due-sum', { kind: this.kind() }));
  protected readonly rows = computed(() => {
    const { totals, rounding_minor } = this.amounts();
    const { allowances_minor, charges_minor, categories } = totals;
    const hasWhole = allowances_minor !== 0 || charges_minor !== 0;
    return [
      ...(hasWhole ? [{ name: $localize`Lines`, amount: this.money(totals.lineSum_minor) }] : []),
      ...(allowances_minor === 0 ? [] : [{ name: $localize`Taken off`, amount: this.money(-allowances_minor) }]),
      ...(charges_minor === 0 ? [] : [{ name: $localize`Put on`, amount: this.money(charges_minor) }]),
      { name: $localize`Without tax`, amount: this.money(totals.net_minor) },
      ...categories.map(({ tax, net_minor, tax_minor }) => ({
        name: isRated(tax.code)
          ? $localize`Tax, ${this.formats.figure('percent', Number(tax.percent))}:rate: of ${this.money(net_minor)}:net:`
          : $localize`${taxCodeNames[tax.code]}:category:, on ${this.money(net_minor)}:net:`,
        amount: this.money(tax_minor),
      })),
      { name: $localize`With tax`, amount: this.money(totals.gross_minor) },
      ...(rounding_minor === 0 ? [] : [{ name: $localize`Rounding`, amount: this.money(rounding_minor) }]),
    ];
  });

  private money(amount_minor: number): string {
    return this.formats.moneyIn(this.currency(), amount_minor);
  }
}
