import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { PriceCost, PriceHead } from '#shared/estimates/price/price';
import { D } from '#shared/money/decimal';
import { Formats } from '../../core/formats/formats';
import { moneyParts, moneyStretches, type MoneyPart, type MoneyPartKey } from './money-parts';
import { PriceNames } from './price-names';

/** Where the money goes: the net price drawn as one bar of its parts, and the same in words and figures. */
@Component({
  selector: 'app-money-bar',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './money-bar.html',
  styleUrl: './money-bar.scss',
})
export class MoneyBar {
  private readonly formats = inject(Formats);
  private readonly names = inject(PriceNames);

  readonly cost = input.required<PriceCost>();
  readonly net_minor = input.required<number>();

  private readonly parts = computed(() => moneyParts(this.cost()));
  protected readonly stretches = computed(() => moneyStretches(this.parts()));
  protected readonly rows = computed(() => this.parts().map((part) => this.rowOf(part)));
  protected readonly net = computed(() => this.formats.money(this.net_minor()));
  protected readonly spoken = computed(() =>
    this.rows()
      .map(({ name, share }) => `${name} ${share}`)
      .join(', '),
  );

  private rowOf(part: MoneyPart) {
    return {
      key: part.key,
      name: this.nameOf(part.key, part.amount_minor),
      about: part.items.map((item) => this.itemOf(item)).join(', '),
      amount: this.formats.money(part.amount_minor),
      share: this.shareOf(part.amount_minor),
    };
  }

  private nameOf(key: MoneyPartKey, amount_minor: number): string {
    if (key === 'overhead') return $localize`Overhead`;
    if (key === 'contingency') return $localize`Contingency`;
    if (key === 'profit') return amount_minor < 0 ? $localize`Loss` : $localize`Profit`;
    return this.names.head(key);
  }

  private itemOf({ name, hours }: PriceHead): string {
    return hours > 0 ? $localize`${name}:grade: ${this.formats.number(hours, hours < 10 ? 1 : 0)}:hours: h` : name;
  }

  private shareOf(amount_minor: number): string {
    const net_minor = this.net_minor();
    if (net_minor <= 0) return '';
    const share_percent = new D(amount_minor).div(net_minor).times(100).toNumber();
    return this.formats.percent(share_percent, 1, 1);
  }
}
