import type { LotStep, LotWork } from '#shared/buildups/lot-works';
import { stepWorkKind } from '#shared/estimates/step-work-kind';
import type { WorkKind } from '#shared/estimates/price/work-kind';
import type { WorkbookFacts } from './workbook-facts';

/** A step of a lot with its number, from 1 on. */
export interface NumberedStep {
  readonly number: number;
  readonly lotNumber: number;
  readonly lot: LotWork;
  readonly step: LotStep;
  readonly kind: WorkKind;
}

/** The steps of all lots that are set up, numbered through. */
export function lotSteps({ prepared }: Pick<WorkbookFacts, 'prepared'>): NumberedStep[] {
  const all = prepared.work.lots.flatMap((lot, place) =>
    lot.steps.filter((step) => !step.isCarving).map((step) => ({ lotNumber: place + 1, lot, step })),
  );
  return all.map((one, place) => ({ ...one, number: place + 1, kind: stepWorkKind[one.step.kind] }));
}
