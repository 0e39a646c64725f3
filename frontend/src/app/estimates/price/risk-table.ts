import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { Percentiles, Risk } from '#shared/estimates/risk/risk';
import { Formats } from '../../core/formats/formats';
import { Figure } from '../../ui/figure/figure';

/** The percentiles shown, in the order of the columns. */
const shown = ['p10', 'p50', 'p80', 'p90'] as const;

/** What the trials say of hours, direct cost and booklets, and the contingency that would follow; the seed is named. */
@Component({
  selector: 'app-risk-table',
  imports: [Figure],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './risk-table.html',
  styleUrl: './small-table.scss',
})
export class RiskTable {
  private readonly formats = inject(Formats);

  readonly risk = input.required<Risk>();
  /** The percentile contingency is taken at. */
  readonly percentile = input.required<number>();
  /** Names of the leaf products. */
  readonly leafNames = input<ReadonlyMap<string, string>>(new Map());
  /** The direct cost the price is worked from, in minor units. */
  readonly direct_minor = input.required<number>();
  readonly isPending = input(false);

  protected readonly columns = computed(() =>
    shown.map((key) => ({ key, name: key.toUpperCase(), isTaken: key === `p${this.percentile()}` })),
  );
  protected readonly rows = computed(() => {
    const { hours, direct_minor, leaf } = this.risk();
    return [
      this.row($localize`Hours`, hours, (figure) => this.formats.number(figure, 1, 1)),
      this.row($localize`Direct cost, ${this.formats.currencySign()}:sign:`, direct_minor, (amount) =>
        this.formats.amount(amount),
      ),
      ...leaf.map(({ productId, booklets }) =>
        this.row(this.leafName(productId), booklets, (figure) => this.formats.number(figure, 0)),
      ),
    ];
  });
  /** Why the direct cost at the likely values is not the one above; empty where it is. */
  protected readonly insuredDifference = computed(() => {
    const difference_minor = this.direct_minor() - this.risk().direct_minor.atLikely;
    return difference_minor === 0 ? '' : this.formats.money(Math.abs(difference_minor));
  });
  protected readonly trials = computed(() => this.formats.number(this.risk().trials, 0));
  protected readonly contingency = computed(() => this.formats.money(this.risk().contingency_minor));
  protected readonly explained = computed(() => ({
    id: 'risk contingency',
    heading: this.contingency(),
    reasons: this.risk().reasons,
  }));

  private leafName(productId: string): string {
    const name = this.leafNames().get(productId);
    return name ? $localize`Booklets, ${name}:leaf:` : $localize`Booklets`;
  }

  private row(name: string, percentiles: Percentiles, write: (figure: number) => string) {
    return {
      name,
      atLikely: write(percentiles.atLikely),
      cells: shown.map((key) => ({ key, text: write(percentiles[key]), isTaken: key === `p${this.percentile()}` })),
    };
  }
}
