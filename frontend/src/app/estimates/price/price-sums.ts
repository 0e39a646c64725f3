import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { PriceLines } from '#shared/estimates/price/price';
import { isOutsideTax } from '#shared/money/is-outside-tax';
import { Formats } from '../../core/formats/formats';
import type { Explained } from '../../ui/figure/explained';
import { Figure } from '../../ui/figure/figure';

interface Sum {
  readonly key: string;
  readonly name: string;
  readonly text: string;
  readonly isStrong: boolean;
  readonly explained?: Explained;
}

/** What lines come to: subtotal and discount where there is one, net and tax by category where there may be tax, and the total. */
@Component({
  selector: 'app-price-sums',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <dl>
      @for (sum of sums(); track sum.key) {
        <div [class.strong]="sum.isStrong">
          <dt>{{ sum.name }}</dt>
          <dd><app-figure [text]="sum.text" [explained]="sum.explained" /></dd>
        </div>
      }
    </dl>
  `,
  styles: `
    dl {
      width: min(100%, 360px);
      margin: 0 0 0 auto;
    }

    div {
      display: flex;
      gap: 16px;
      justify-content: space-between;
      padding: 5px 10px;
      border-top: 1px dotted var(--line);
    }

    dt {
      color: var(--muted);
    }

    dd {
      margin: 0;
      white-space: nowrap;
    }

    .strong {
      border-top: 1px solid var(--line);
      font-weight: 700;

      dt {
        color: inherit;
      }
    }
  `,
})
export class PriceSums {
  private readonly formats = inject(Formats);

  readonly price = input.required<PriceLines>();
  readonly taxName = input<(taxCategoryId: string) => string>(() => '');

  protected readonly sums = computed<readonly Sum[]>(() => {
    const { subtotal_minor, discount_minor, gross_minor } = this.price();
    const discounted = [
      this.sum('subtotal', $localize`Subtotal`, subtotal_minor),
      this.sum('discount', $localize`Discount`, -discount_minor),
    ];
    return [
      ...(discount_minor === 0 ? [] : discounted),
      ...this.taxedSums(),
      this.worked('gross', $localize`Total`, gross_minor),
    ];
  });

  private taxedSums(): Sum[] {
    const { net_minor, taxes } = this.price();
    if (isOutsideTax(taxes.map(({ tax }) => tax))) return [];
    const each = taxes.map(({ taxCategoryId, tax, tax_minor }) => {
      const percent = this.formats.figure('percent', Number(tax.percent));
      const name = this.taxName()(taxCategoryId);
      return this.sum(
        `tax ${taxCategoryId}`,
        name ? `${name}, ${percent}` : $localize`Tax, ${percent}:rate:`,
        tax_minor,
      );
    });
    return [this.worked('net', $localize`Net`, net_minor), ...each];
  }

  private sum(key: string, name: string, amount_minor: number): Sum {
    return { key, name, text: this.formats.money(amount_minor), isStrong: false };
  }

  private worked(key: string, name: string, amount_minor: number): Sum {
    const text = this.formats.money(amount_minor);
    const explained = { id: `sum ${key}`, heading: text, reasons: this.price().reasons };
    return { key, name, text, isStrong: true, explained };
  }
}
