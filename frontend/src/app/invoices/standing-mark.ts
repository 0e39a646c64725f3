import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { InvoiceSummary } from '#shared/invoices/invoice-schema';
import { invoiceStandingNames, standingOf } from './invoice-names';

/** Where an invoice or credit note stands, in a word in its colour. */
@Component({
  selector: 'app-standing-mark',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `<span class="chip" [class]="standing()">{{ name() }}</span>`,
  styles: `
    .draft {
      border-style: dashed;
      color: var(--muted);
    }

    .overdue {
      border-color: var(--wrong);
      color: var(--wrong);
      font-weight: 500;
    }

    .open {
      border-color: var(--ochre);
    }

    .settled {
      border-color: var(--verdigris);
      color: var(--verdigris);
    }
  `,
})
export class StandingMark {
  readonly invoice = input.required<InvoiceSummary>();

  protected readonly standing = computed(() => standingOf(this.invoice()));
  protected readonly name = computed(() => invoiceStandingNames[this.standing()]);
}
