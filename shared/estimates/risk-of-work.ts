import type { SpreadPattern } from '#shared/buildups/step-hours';
import type { EstimateWork } from '#shared/estimates/estimate-work';
import { hourCosts, type HourCost } from '#shared/estimates/hour-costs';
import { riskLeaf } from '#shared/estimates/risk-leaf';
import type { RiskDraw, RiskHours, RiskInput } from '#shared/estimates/risk/risk-input';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { mapTriple, type Triple } from '#shared/units/triple';
import { tripleSum } from '#shared/units/triple-sum';

interface Drawn {
  readonly draw: RiskDraw;
  readonly hours: RiskHours;
}

interface Hand {
  readonly gradeId: string;
  readonly hours: Triple;
}

/** One draw that moves hours of several hands together; the draw itself is in hours. */
function drawnHours(key: string, triple: Triple, work: { hands: readonly Hand[]; cost: HourCost }): Drawn[] {
  if (triple.likely <= 0) return [];
  const hours = work.hands.reduce((sum, hand) => sum + hand.hours.likely, 0);
  const cost_minor = work.hands.reduce((sum, hand) => sum + hand.hours.likely * work.cost(hand.gradeId), 0);
  const perUnit = { hoursPerUnit: hours / triple.likely, costPerUnit_minor: cost_minor / triple.likely };
  return [{ draw: { key, triple }, hours: { drawKey: key, ...perUnit } }];
}

function carvingDraws({ carving }: EstimateWork, card: RateCard, cost: HourCost): Drawn[] {
  const gradeId = card.carving.patternGradeId;
  return [
    ...carving.ornaments.flatMap((ornament) =>
      drawnHours(`ornament/${ornament.ornamentId}`, ornament.carving, { hands: ornament.grades, cost }),
    ),
    ...carving.patterns.flatMap(({ ornamentId, hours }) =>
      drawnHours(`pattern/${ornamentId}`, hours, { hands: [{ gradeId, hours }], cost }),
    ),
  ];
}

/** Hands-on work other than laying, which follows the leaves; all steps of one pattern of spread move together. */
function handsOnDraws({ zones }: EstimateWork, card: RateCard, cost: HourCost): Drawn[] {
  const steps = zones.flatMap((zone) => zone.handsOn.steps).filter((step) => step.perLaid_hours === null);
  const patterns: readonly SpreadPattern[] = ['gilding', 'painting', 'consolidating', 'cleaning'];
  return patterns.flatMap((pattern) => {
    const hands = steps.filter((step) => step.pattern === pattern);
    const whole = tripleSum(hands.map((hand) => hand.hours));
    if (whole.likely <= 0) return [];
    const factor = pattern === 'gilding' ? card.buildUps.spread : mapTriple(whole, (hours) => hours / whole.likely);
    return drawnHours(`spread/${pattern}`, factor, { hands, cost });
  });
}

/** Everything that can turn out otherwise than likely, put so that one draw moves all that hangs on it. */
export interface RiskOfWork extends Pick<RiskInput, 'draws' | 'hours' | 'leaf'> {
  /** Hours of these draws and their cost at the likely values, in minor units, not rounded. */
  readonly likelyHours: number;
  readonly likelyCost_minor: number;
}

/** Prepares the risk of an estimate's work: carving by ornament, hands-on work by pattern, leaf by its losses. Costs in minor units. */
export function riskOfWork(work: EstimateWork, card: RateCard, digits: number): RiskOfWork {
  const cost = hourCosts(card.money, digits);
  const drawn = [...carvingDraws(work, card, cost), ...handsOnDraws(work, card, cost)];
  const leaf = riskLeaf(work, card, { cost, digits });
  const likely = (pick: (hours: RiskHours) => number) =>
    drawn.reduce((sum, { draw, hours }) => sum + draw.triple.likely * pick(hours), 0);
  return {
    draws: [...new Map([...drawn.map((one) => one.draw), ...leaf.draws].map((draw) => [draw.key, draw])).values()],
    hours: drawn.map((one) => one.hours),
    leaf: leaf.products,
    likelyHours: likely((hours) => hours.hoursPerUnit) + leaf.likelyHours,
    likelyCost_minor: likely((hours) => hours.costPerUnit_minor) + leaf.likelyCost_minor,
  };
}
