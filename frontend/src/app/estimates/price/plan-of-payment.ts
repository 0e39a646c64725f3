import { Injectable, inject } from '@angular/core';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { StagePayments } from '#shared/money/stage-payments';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { smallScreen } from '../../ui/screen/small-screen';
import type { StageEntry } from './stage-entries';
import { paymentPlan, stageColumns, type StageRow } from './stage-rows';

/** The plan of payment as a table, of a draft or of an issue. */
@Injectable({ providedIn: 'root' })
export class PlanOfPayment {
  private readonly formats = inject(Formats);
  private readonly isSmall = smallScreen();

  caption(tax_minor: number): string {
    return tax_minor === 0 ? $localize`Payments` : $localize`Payments, with tax`;
  }

  columns(remark: (cell: string) => string, mayEdit: boolean): FigureColumn<StageRow>[] {
    return stageColumns(this.formats, { mayEdit, isSmall: this.isSmall(), remark });
  }

  rows(
    entries: readonly StageEntry[],
    payments: StagePayments | undefined,
    terms: Pick<EstimateSettings['stages'], 'deposit_percent' | 'retention_percent'>,
  ): StageRow[] {
    const { deposit_percent, retention_percent } = terms;
    const [taken, held] = [deposit_percent, retention_percent / 2].map((share) =>
      this.formats.figure('percent', share),
    );
    return paymentPlan(entries, payments, {
      deposit: deposit_percent > 0 ? $localize`Deposit, ${taken}:percent:` : undefined,
      whole: $localize`All of the work`,
      releases:
        retention_percent > 0
          ? [$localize`Retention, first half, ${held}:percent:`, $localize`Retention, second half, ${held}:percent:`]
          : undefined,
    });
  }
}
