import { grossLeaves, type LossPoint } from '#shared/leaf/gross-leaves';
import type { LayingWay, LeafCard, LeafFinish } from '#shared/leaf/leaf-card';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import { triangularPercentile } from '#shared/units/triangular-percentile';
import type { Triple } from '#shared/units/triple';

/** Second laying of one finish, on its share (0…1) of the zone. */
export interface SecondLaying {
  readonly finish: LeafFinish;
  readonly share: number;
  readonly percent: Triple;
}

/** The three losses of a way of laying and a finish, in percent. */
export interface ZoneLosses {
  readonly breakage_percent: Triple;
  readonly faulting_percent: Triple;
  /** Of the whole zone, blended by share where it is burnished and matte. */
  readonly second_percent: Triple;
  readonly secondLayings: readonly SecondLaying[];
}

type Finished = Pick<ZoneLeafInput, 'ground' | 'burnishedShare'>;

// What is burnished takes the row of burnished and matte, the rest that of matte gilding.
function sharesOf({ ground, burnishedShare }: Finished): Pick<SecondLaying, 'finish' | 'share'>[] {
  const { finish } = ground;
  if (finish !== 'water-burnished-and-matte') return [{ finish, share: 1 }];
  return [
    { finish, share: burnishedShare },
    { finish: 'water-matte', share: 1 - burnishedShare },
  ];
}

const blended = (layings: readonly SecondLaying[]): Triple => {
  const sum = (pick: (triple: Triple) => number) =>
    layings.reduce((total, { share, percent }) => total + share * pick(percent), 0);
  return { low: sum(({ low }) => low), likely: sum(({ likely }) => likely), high: sum(({ high }) => high) };
};

/** Breakage and faulting belong to the way of laying, second laying to the finish, by the share of each where a zone is burnished and matte; percent. */
export function zoneLosses(way: LayingWay, finished: Finished, card: LeafCard): ZoneLosses {
  const secondLayings = sharesOf(finished).map(({ finish, share }) => ({
    ...{ finish, share },
    percent: card.secondLaying_percent[finish][way],
  }));
  return { ...card.losses[way], second_percent: blended(secondLayings), secondLayings };
}

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
