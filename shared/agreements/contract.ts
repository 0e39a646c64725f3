import type { StagePlan } from '#shared/money/stage-payments';
import type { MinorUnits } from '#shared/money/decimal';
import type { TaxedNet } from '#shared/money/tax-by-category';
import type { TaxCode } from '#shared/money/tax-codes';
import type { Choice } from '#shared/estimates/draft';

/** Why nothing is charged under a category, in the words that were frozen with the issue. */
export interface TaxExemption {
  readonly code: TaxCode;
  readonly reason: string;
}

/** One accepted issue: of the estimate itself, or of a variation after it. Amounts are whole minor units, taxes as the issue states them. */
export interface ContractPart {
  readonly issueId: string;
  readonly estimateId: string;
  readonly kind: 'estimate' | 'variation';
  /** As papers name it, with the letter of the issue. */
  readonly number: string;
  readonly title: string;
  /** Day in the workshop's zone. */
  readonly acceptedOn: string;
  readonly choice: Choice;
  readonly taxes: readonly TaxedNet[];
  /** One at most for each category among the taxes. */
  readonly exemptions: readonly TaxExemption[];
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
  readonly plan: StagePlan;
  /** What the stages of the plan are called, in their order. */
  readonly stageNames: readonly string[];
}

/** What a workshop and its client have agreed on one job: the accepted issue and the accepted variations; one currency throughout. */
export interface Contract {
  readonly jobId: string;
  readonly clientId: string;
  readonly currency: string;
  readonly parts: readonly ContractPart[];
  readonly net_minor: MinorUnits;
  readonly tax_minor: MinorUnits;
  readonly gross_minor: MinorUnits;
}
