import { grossLeaves, type LossPoint } from '#shared/leaf/gross-leaves';
import type { LayingWay, LeafCard, LeafFinish } from '#shared/leaf/leaf-card';
import { triangularPercentile } from '#shared/units/triangular-percentile';
import type { Triple } from '#shared/units/triple';

/** The three losses of a way of laying and a finish, in percent. */
export interface ZoneLosses {
  readonly breakage_percent: Triple;
  readonly faulting_percent: Triple;
  readonly second_percent: Triple;
}

/** Breakage and faulting belong to the way of laying, second laying to the finish. */
export const zoneLosses = (way: LayingWay, finish: LeafFinish, card: LeafCard): ZoneLosses => ({
  ...card.losses[way],
  second_percent: card.secondLaying_percent[finish][way],
});

const lossPoint = (losses: ZoneLosses, pick: (triple: Triple) => number): LossPoint => ({
  breakage_percent: pick(losses.breakage_percent),
  faulting_percent: pick(losses.faulting_percent),
  second_percent: pick(losses.second_percent),
});

/** Gross leaves of net ones with every loss at its low, likely and high. */
export const grossTriple = (net: number, losses: ZoneLosses): Triple => ({
  low: grossLeaves(
    net,
    lossPoint(losses, (triple) => triple.low),
  ),
  likely: grossLeaves(
    net,
    lossPoint(losses, (triple) => triple.likely),
  ),
  high: grossLeaves(
    net,
    lossPoint(losses, (triple) => triple.high),
  ),
});

/** Gross leaves of net ones with every loss at the same percentile (0…1) of its triangle: all go well together, or badly. */
export const grossPercentile = (net: number, losses: ZoneLosses, share: number): number =>
  grossLeaves(
    net,
    lossPoint(losses, (triple) => triangularPercentile(triple, share)),
  );
