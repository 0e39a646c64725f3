import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { StagePayments } from '#shared/money/stage-payments';
import { Formats } from '../../core/formats/formats';
import { FigureTable } from '../../ui/table/figure-table';
import { PlanOfPayment } from '../price/plan-of-payment';
import type { StageRow } from '../price/stage-rows';
import { TakenAwayNote } from '../price/taken-away-note';

/** How the contract is paid, as it was frozen. */
@Component({
  selector: 'app-frozen-payments',
  imports: [FigureTable, TakenAwayNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (gross_minor() < 0) {
      <app-taken-away-note [gross_minor]="gross_minor()" [tax_minor]="tax_minor()" />
    } @else {
      <app-figure-table
        [caption]="plan.caption(tax_minor())"
        captionShown
        [columns]="columns()"
        [rows]="rows()"
        [rowId]="rowId"
      />
    }
  `,
})
export class FrozenPayments {
  private readonly formats = inject(Formats);
  protected readonly plan = inject(PlanOfPayment);

  readonly stages = input.required<EstimateSettings['stages']>();
  readonly payments = input.required<StagePayments>();
  readonly gross_minor = input.required<number>();
  readonly tax_minor = input.required<number>();

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
