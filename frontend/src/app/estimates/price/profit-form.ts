import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import type { EstimateSettings } from '#shared/estimates/settings';
import { textOf } from '#shared/money/text-of';
import type { Contingency, Profit } from '#shared/rate-cards/money-card';
import { Formats } from '../../core/formats/formats';
import { DecimalField } from '../../ui/field/decimal-field';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FindingList } from '../../ui/page/finding-list';
import { EstimateStore } from '../estimate-store';
import { liveForm } from '../settings/live-form';
import {
  noProfitEntries,
  profitEntriesOf,
  profitFormSchema,
  profitSaidAs,
  profitSettingsOf,
  type ProfitEntries,
} from './profit-form-schema';
import { ProfitFigures } from './profit-figures';
import { RiskTable } from './risk-table';

/** Profit, contingency, discount and tax of the estimate, and what is left; each follows the rate card unless it is entered here. */
@Component({
  selector: 'app-profit-form',
  imports: [DecimalField, Entry, Field, FindingList, ProfitFigures, ReactiveFormsModule, RiskTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './profit-form.html',
  styles: `
    :host {
      display: grid;
      gap: 28px;
    }

    form {
      display: grid;
      gap: 12px 16px;
      // A choice says a whole sentence, a figure stands beside it.
      grid-template-columns: minmax(0, 3fr) minmax(0, 2fr);
      align-items: start;
    }

    .first {
      grid-column: 1;
    }

    @media (max-width: 640px) {
      form {
        grid-template-columns: minmax(0, 1fr);
      }
    }
  `,
})
export class ProfitForm {
  private readonly formats = inject(Formats);
  protected readonly store = inject(EstimateStore);

  protected readonly live = liveForm(
    {
      key: () => 'profit',
      schema: profitFormSchema,
      present: () => this.entries(),
      apply: (value) => {
        this.profitBefore = this.shared();
        this.store.changeSettings(profitSettingsOf(value));
      },
    },
    noProfitEntries,
  );

  private profitBefore: Profit | undefined;
  private readonly money = computed(() => this.store.card()?.money);
  protected readonly entries = computed<ProfitEntries | undefined>(() => {
    const settings = this.store.settings();
    return settings?.extras ? profitEntriesOf(settings as EstimateSettings) : undefined;
  });
  protected readonly cost = computed(() => this.store.costed()?.cost);
  protected readonly isAgreed = computed(() => this.store.settings()?.profit?.way === 'lump-sum');
  protected readonly belowCost = computed(() =>
    (this.cost()?.findings ?? []).filter(({ code }) =>
      ['price-below-cost', 'price-below-nothing', 'price-takes-away'].includes(code),
    ),
  );
  protected readonly taxCategories = computed(() =>
    (this.money()?.taxCategories ?? []).map(({ id, name, percent }) => ({
      id,
      label: `${name}, ${this.percent(percent)}`,
    })),
  );
  protected readonly cardProfit = computed(() => this.profitInWords(this.money()?.profit));
  protected readonly cardContingency = computed(() => this.contingencyInWords(this.money()?.contingency));
  protected readonly leafNames = computed(
    () => new Map((this.store.figures()?.leaf ?? []).map(({ productId, name }) => [productId, name])),
  );
  protected readonly percentile = computed(() => this.money()?.contingency.percentile ?? 80);

  /** The margin or mark-up lines are worked with. */
  private shared(): Profit | undefined {
    return this.own() ?? this.money()?.profit;
  }

  /** A margin or mark-up of the estimate's own. */
  private own(): Profit | undefined {
    const profit = this.store.settings()?.profit;
    return profit && profit.way !== 'lump-sum' ? profit : undefined;
  }

  /** Changing the way keeps the price where it is. */
  protected takeProfitWay(): void {
    const { profit, lumpSum } = this.live.group.getRawValue();
    if (profit === 'lump-sum') {
      const subtotal_minor = this.store.priced()?.price.subtotal_minor ?? 0;
      if (!lumpSum) this.live.group.patchValue({ lumpSum: textOf(subtotal_minor, this.formats.currencyDigits()) });
      return;
    }
    const own = this.own();
    // Where the old percentage could be read the other way it is in the draft already.
    const before = own?.way === profit ? this.profitBefore : this.shared();
    if (before && profit && profit !== 'card')
      this.live.group.patchValue({ profit_percent: profitSaidAs(profit, before) });
  }

  /** A share of its own begins with that of the card. */
  protected takeContingencyWay(): void {
    const { contingency, contingency_percent } = this.live.group.getRawValue();
    const percent = this.money()?.contingency.percent ?? '0';
    if (contingency === 'share' && !contingency_percent) this.live.group.patchValue({ contingency_percent: percent });
  }

  /** A percentage and an amount are not the same figure: it is asked for anew. */
  protected takeDiscountWay(): void {
    this.live.group.patchValue({ discountAmount: '' });
  }

  private profitInWords(profit: Profit | undefined): string {
    if (!profit) return '';
    const percent = this.percent(profit.percent);
    return profit.way === 'margin'
      ? $localize`margin of ${percent}:percent:`
      : $localize`mark-up of ${percent}:percent:`;
  }

  private contingencyInWords(contingency: Contingency | undefined): string {
    if (!contingency) return '';
    if (contingency.way === 'risk') return $localize`from risk, P${contingency.percentile}:percentile:`;
    return $localize`${this.percent(contingency.percent)}:percent: of the direct cost`;
  }

  private percent(percent: string): string {
    return this.formats.figure('percent', Number(percent));
  }
}
