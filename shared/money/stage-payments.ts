import { D, type DecimalText, type MinorUnits } from '#shared/money/decimal';
import { cumulativeParts, cumulativePercents } from '#shared/money/cumulative-parts';
import { percentOf } from '#shared/money/percent-of';
import { safeMinor } from '#shared/money/safe-minor';

/** How a contract is paid; all in percent of it, stages one by one and 100 together. */
export interface StagePlan {
  readonly deposit_percent: DecimalText | number;
  readonly stages_percent: readonly (DecimalText | number)[];
  readonly retention_percent: DecimalText | number;
}

/** One stage: its share of the contract, what is recovered of the deposit and held back, and what is paid. */
export interface StagePayment {
  readonly work_minor: MinorUnits;
  readonly recovered_minor: MinorUnits;
  readonly retained_minor: MinorUnits;
  readonly paid_minor: MinorUnits;
}

/** Every payment of a contract: deposit + stages + both releases are the contract, to the last minor unit. */
export interface StagePayments {
  readonly deposit_minor: MinorUnits;
  readonly stages: readonly StagePayment[];
  /** Retention given back: the first half (the larger when odd) and the second. */
  readonly releases_minor: readonly [MinorUnits, MinorUnits];
}

function checkPlan(plan: StagePlan, reached: readonly D[]): void {
  if (!reached.at(-1)?.equals(100)) throw new RangeError('the stages must come to 100 % together');
  const withheld = new D(String(plan.deposit_percent)).plus(String(plan.retention_percent));
  if (withheld.greaterThan(100)) throw new RangeError('deposit and retention must not come to more than 100 %');
}

/**
 * The payments of a contract in whole minor units: stages are differences of rounded cumulative amounts, the deposit is recovered
 * pro rata, retention is released in two halves. RangeError when the stages are not 100 % or too much is withheld.
 */
export function stagePayments(contract_minor: MinorUnits, plan: StagePlan): StagePayments {
  const reached = cumulativePercents(plan.stages_percent);
  checkPlan(plan, reached);
  const deposit_minor = percentOf(contract_minor, String(plan.deposit_percent));
  const retention_minor = percentOf(contract_minor, String(plan.retention_percent));
  const recovered = cumulativeParts(deposit_minor, reached);
  const retained = cumulativeParts(retention_minor, reached);
  const stages = cumulativeParts(contract_minor, reached).map((work_minor, place) => ({
    work_minor,
    recovered_minor: recovered[place],
    retained_minor: retained[place],
    paid_minor: safeMinor(work_minor - recovered[place] - retained[place]),
  }));
  const first = percentOf(retention_minor, '50');
  return { deposit_minor, stages, releases_minor: [first, safeMinor(retention_minor - first)] };
}
