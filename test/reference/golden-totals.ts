import type { EstimateInput } from '#shared/estimates/estimate-figures';
import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import { riskOf } from '#shared/estimates/risk/risk-of';

/** What an issue comes to: every total a client or the workshop was told, and nothing of how it is explained. */
function totalsOf({ tally, grades, leaf, materials, dry, price, stages, cost }: Figures) {
  const { subtotal_minor, discount_minor, net_minor, tax_minor, gross_minor } = price;
  const { direct_minor, overhead_minor, contingency_minor, cost_minor, profit_minor } = cost.price;
  return {
    tally,
    grades: grades.map(({ gradeId, hours }) => ({ gradeId, hours })),
    leaf: leaf.map(({ productId, netLeaves, grossLeaves, booklets }) => ({
      productId,
      netLeaves,
      grossLeaves,
      booklets,
    })),
    materials: materials.map(({ materialId, need, bought }) => ({ materialId, need, bought })),
    days: { elapsed_minutes: dry.elapsed_minutes, carving_minutes: dry.carving_minutes },
    lines: price.lines.map(({ id, price_minor }) => ({ id, price_minor })),
    price: { subtotal_minor, discount_minor, net_minor, tax_minor, gross_minor },
    stages,
    cost: { direct_minor, overhead_minor, contingency_minor, cost_minor, profit_minor },
    risk: cost.risk && { direct_minor: cost.risk.direct_minor, contingency_minor: cost.risk.contingency_minor },
  };
}

/** The totals of the base and of every alternative by itself. */
export function goldenTotals(input: EstimateInput) {
  const choices = [[], ...input.draft.settings.alternatives.map(({ id }) => [id])];
  return choices.map((choice) => {
    const prepared = prepareEstimate({ ...input, choice });
    return { choice, totals: totalsOf(estimateFigures(prepared, riskOf(prepared.risk))) };
  });
}
