import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { StagePayments } from '#shared/money/stage-payments';
import { Formats } from '../../core/formats/formats';
import { FigureTable } from '../../ui/table/figure-table';
import { PlanOfPayment } from '../price/plan-of-payment';
import type { StageRow } from '../price/stage-rows';

/** How the contract is paid, as it was frozen. */
@Component({
  selector: 'app-frozen-payments',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      i18n-caption
      caption="Payments, with tax"
      captionShown
      [columns]="columns()"
      [rows]="rows()"
      [rowId]="rowId"
    />
  `,
})
export class FrozenPayments {
  private readonly formats = inject(Formats);
  private readonly plan = inject(PlanOfPayment);

  readonly stages = input.required<EstimateSettings['stages']>();
  readonly payments = input.required<StagePayments>();

  protected readonly columns = computed(() => this.plan.columns(() => '', false));
  protected readonly rows = computed(() => {
    const entries = this.stages().parts.map(({ id, name, percent }) => ({
      id,
      name,
      share: this.formats.typed(percent),
    }));
    return this.plan.rows(entries, this.payments(), this.stages());
  });
  protected readonly rowId = ({ id }: StageRow): string => id;
}
