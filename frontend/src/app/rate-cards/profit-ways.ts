import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { marginOfMarkUp, markUpOfMargin } from '#shared/money/margin';
import type { Profit } from '#shared/rate-cards/money-card';
import { Formats } from '../core/formats/formats';
import { CardStore } from './card/card-store';

/** The same profit on price and on cost, so that one is never taken for the other. */
function bothWays({ way, percent }: Profit): { margin: number; markUp: number } | undefined {
  const figure = Number(percent);
  if (percent === '' || Number.isNaN(figure) || figure < 0 || (way === 'margin' && figure >= 100)) return undefined;
  return way === 'margin'
    ? { margin: figure, markUp: markUpOfMargin(percent).toNumber() }
    : { margin: marginOfMarkUp(percent).toNumber(), markUp: figure };
}

/** Profit said both ways: as a margin on price and as a mark-up on cost. */
@Component({
  selector: 'app-profit-ways',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (ways(); as both) {
      <p role="status" i18n>
        A margin of <strong>{{ both.margin }}</strong> on the price is a mark-up of
        <strong>{{ both.markUp }}</strong> on the cost.
      </p>
    }
  `,
  styles: `
    p {
      padding: 8px 16px;
      border-left: 3px solid var(--gold);
      background: var(--tint);
    }
  `,
})
export class ProfitWays {
  private readonly store = inject(CardStore);
  private readonly formats = inject(Formats);

  protected readonly ways = computed(() => {
    const profit = this.store.content()?.money.profit;
    const both = profit && bothWays(profit);
    return both && { margin: this.percent(both.margin), markUp: this.percent(both.markUp) };
  });

  private percent(figure: number): string {
    return this.formats.figure('percent', figure);
  }
}
