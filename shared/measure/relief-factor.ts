import type { MeasureCard } from '#shared/measure/measure-card';
import type { Relief } from '#shared/measure/relief';
import type { Reason } from '#shared/words/reason';

/**
 * True surface ÷ plan surface for a relief, from the card, with the house value it came from; work in the round that was measured
 * as such takes the card's other factor. Geometry only, never a payment multiplier.
 */
export function reliefFactor(relief: Relief, isTrueSurface: boolean, card: MeasureCard): Reason & { figure: number } {
  const isMeasured = relief === 'in-the-round' && isTrueSurface;
  return {
    code: 'measure-relief',
    values: { relief },
    figure: isMeasured ? card.measuredInTheRoundFactor : card.reliefFactors[relief],
    unit: 'factor',
    house: isMeasured ? 'measure.measuredInTheRoundFactor' : `measure.reliefFactors.${relief}`,
  };
}
