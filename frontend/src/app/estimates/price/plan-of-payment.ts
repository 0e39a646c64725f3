import { Injectable, inject } from '@angular/core';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { StagePayments } from '#shared/money/stage-payments';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { smallScreen } from './small-screen';
import type { StageEntry } from './stage-entries';
import { paymentPlan, stageColumns, type StageRow } from './stage-rows';

/** The plan of payment as a table, of a draft or of an issue. */
@Injectable({ providedIn: 'root' })
export class PlanOfPayment {
  private readonly formats = inject(Formats);
  private readonly isSmall = smallScreen();

  columns(remark: (cell: string) => string, mayEdit: boolean): FigureColumn<StageRow>[] {
    return stageColumns(this.formats, { mayEdit, isSmall: this.isSmall(), remark });
  }

  rows(
    entries: readonly StageEntry[],
    payments: StagePayments | undefined,
    terms: Pick<EstimateSettings['stages'], 'deposit_percent' | 'retention_percent'>,
  ): StageRow[] {
    const shares = [terms.deposit_percent, terms.retention_percent / 2];
    const [taken, held] = shares.map((share) => this.formats.figure('percent', share));
    return paymentPlan(entries, payments, {
      deposit: $localize`Deposit, ${taken}:percent:`,
      whole: $localize`All of the work`,
      releases: [
        $localize`Retention, first half, ${held}:percent:`,
        $localize`Retention, second half, ${held}:percent:`,
      ],
    });
  }
}
