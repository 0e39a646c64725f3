import { startBuildUps } from '#shared/buildups/start-buildups';
import { startCarving } from '#shared/carving/start-carving';
import { startDrying } from '#shared/drying/start-drying';
import { startLeaf } from '#shared/leaf/start-leaf';
import { startMeasure } from '#shared/measure/start-measure';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { startMoney } from '#shared/rate-cards/start-money';

/** The rate card a workshop starts from: house values throughout, all of them its own to change. */
export const startCard: RateCard = {
  measure: startMeasure,
  carving: startCarving,
  leaf: startLeaf,
  buildUps: startBuildUps,
  drying: startDrying,
  money: startMoney,
};
