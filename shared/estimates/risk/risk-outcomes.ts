import type { RiskColumns } from '#shared/estimates/risk/risk-columns';
import type { RiskInput, RiskLeaf, RiskLeafUse } from '#shared/estimates/risk/risk-input';
import { countUp } from '#shared/money/settled';

/** Leaves and booklets of one product in every trial. */
export interface LeafOutcomes {
  readonly productId: string;
  readonly leaves: Float64Array;
  readonly booklets: Float64Array;
}

/** What every trial comes to: direct hours, direct cost in (unrounded) minor units, leaf. */
export interface RiskOutcomes {
  readonly hours: Float64Array;
  readonly direct: Float64Array;
  readonly leaf: readonly LeafOutcomes[];
}

function columnOf(columns: RiskColumns, key: string): Float64Array {
  const found = columns.get(key);
  if (!found) throw new RangeError(`nothing is drawn for ${key}`);
  return found;
}

/** Gross leaves: net × (1 + second + faulting × (1 − second)) ÷ (1 − breakage), in every trial. */
function grossLeaves(use: RiskLeafUse, columns: RiskColumns): Float64Array {
  const faulting = columnOf(columns, use.faultingKey);
  const seconds = use.secondLayings.map(({ key, share }) => ({ share, drawn: columnOf(columns, key) }));
  return columnOf(columns, use.breakageKey).map((breakage, trial) => {
    const second = seconds.reduce((sum, { share, drawn }) => sum + share * drawn[trial], 0);
    const laid = 1 + second + faulting[trial] * (1 - second);
    return (use.netLeaves * laid) / (1 - breakage);
  });
}

/** What so many booklets cost, in minor units; beyond the list every further one costs what the last step did. */
function bookletsCost({ bookletCosts_minor: costs }: RiskLeaf, booklets: number): number {
  const last = costs.length - 1;
  return booklets <= last ? costs[booklets] : costs[last] + (booklets - last) * (costs[last] - costs[last - 1]);
}

function addHours(outcomes: RiskOutcomes, input: RiskInput, columns: RiskColumns): void {
  const { hours, direct } = outcomes;
  for (const item of input.hours) {
    const drawn = columnOf(columns, item.drawKey);
    for (let trial = 0; trial < drawn.length; trial += 1) {
      hours[trial] += drawn[trial] * item.hoursPerUnit;
      direct[trial] += drawn[trial] * item.costPerUnit_minor;
    }
  }
}

/** Laying goes by gross leaves, spread as all hands-on gilding is. */
function addLaying({ hours, direct }: RiskOutcomes, use: RiskLeafUse, laid: Float64Array): void {
  for (let trial = 0; trial < laid.length; trial += 1) {
    hours[trial] += laid[trial] * use.hoursPerLeaf;
    direct[trial] += laid[trial] * use.costPerLeaf_minor;
  }
}

function leafOutcomes(leaf: RiskLeaf, outcomes: RiskOutcomes, columns: RiskColumns): LeafOutcomes {
  const leaves = new Float64Array(outcomes.hours.length);
  for (const use of leaf.uses) {
    const gross = grossLeaves(use, columns);
    gross.forEach((more, trial) => (leaves[trial] += more));
    const spread = use.spreadKey === null ? null : columnOf(columns, use.spreadKey);
    addLaying(outcomes, use, spread ? gross.map((count, trial) => count * spread[trial]) : gross);
  }
  const booklets = leaves.map((count) => countUp(count / leaf.leavesPerBooklet));
  booklets.forEach((count, trial) => (outcomes.direct[trial] += bookletsCost(leaf, count)));
  return { productId: leaf.productId, leaves, booklets };
}

/** Works every trial through, leaf in whole booklets within it; RangeError when something hangs on a draw that is not there. */
export function riskOutcomes(input: RiskInput, columns: RiskColumns, trials: number): RiskOutcomes {
  const hours = new Float64Array(trials).fill(input.fixedHours);
  const direct = new Float64Array(trials).fill(input.fixed_minor);
  const begun: RiskOutcomes = { hours, direct, leaf: [] };
  addHours(begun, input, columns);
  return { hours, direct, leaf: input.leaf.map((leaf) => leafOutcomes(leaf, begun, columns)) };
}
