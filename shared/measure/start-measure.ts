import type { MeasureCard } from '#shared/measure/measure-card';

/** House values a new workshop starts from: invented, judged at the bench, in no published text. */
export const startMeasure: MeasureCard = {
  reliefFactors: { flat: 1, low: 1.15, middle: 1.35, high: 1.7, pierced: 2, 'in-the-round': 1.6 },
  measuredInTheRoundFactor: 1,
};
