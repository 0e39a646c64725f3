import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { PriceCost } from '#shared/estimates/price/price';
import { Formats } from '../../core/formats/formats';
import { Figure } from '../../ui/figure/figure';
import { profitExplained } from './profit-explained';

/** Margin and mark-up beside each other, as asked for and as a discount leaves them, and what that is in money. */
@Component({
  selector: 'app-profit-figures',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <table [attr.aria-busy]="isPending() || null">
      <caption class="visually-hidden" i18n>
        Margin and mark-up
      </caption>
      <thead>
        <tr>
          <td></td>
          <th scope="col" i18n>Margin, % of the price</th>
          <th scope="col" i18n>Mark-up, % on the cost</th>
          <th scope="col" i18n>Profit</th>
        </tr>
      </thead>
      <tbody>
        <tr>
          <th scope="row" i18n>asked</th>
          <td>{{ percent(isAgreed() ? null : cost().margin_percent) }}</td>
          <td>{{ percent(isAgreed() ? null : cost().markUp_percent) }}</td>
          <td></td>
        </tr>
        <tr class="strong" [class.loss]="cost().profit_minor < 0">
          <th scope="row" i18n>left</th>
          <td>{{ percent(cost().marginLeft_percent) }}</td>
          <td>{{ percent(cost().markUpLeft_percent) }}</td>
          <td><app-figure [text]="profit()" [explained]="explained()" /></td>
        </tr>
      </tbody>
    </table>
    @if (isPending()) {
      <p class="muted small" role="status" i18n>
        The contingency is being worked out; these are the figures of a moment ago.
      </p>
    }
    @if (cost().priced_minor > 0) {
      <p class="muted small" i18n>
        {{ priced() }} of the price are lines entered at a price of their own, with no cost behind them; they count as
        profit.
      </p>
    }
  `,
  styleUrl: './small-table.scss',
})
export class ProfitFigures {
  private readonly formats = inject(Formats);

  readonly cost = input.required<PriceCost>();
  /** The price is an agreed sum: no margin was asked for. */
  readonly isAgreed = input(false);
  readonly isPending = input(false);

  protected readonly profit = computed(() => this.formats.money(this.cost().profit_minor));
  protected readonly priced = computed(() => this.formats.money(this.cost().priced_minor));
  protected readonly explained = computed(() => profitExplained(this.formats, this.cost()));

  protected percent(figure: number | null): string {
    return figure === null ? '–' : this.formats.number(figure, 2, 2);
  }
}
