import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { Triple } from '#shared/units/triple';

/** Ways of laying leaf: whole on broad surfaces, in strips along mouldings, in small cuts on carving. */
export const layingWays = ['sheets', 'lays', 'patches'] as const;
export type LayingWay = (typeof layingWays)[number];

/** What the gilding is finished as; it says how much of it is laid a second time. */
export const leafFinishes = ['water-burnished', 'water-matte', 'water-burnished-and-matte', 'oil'] as const;
export type LeafFinish = (typeof leafFinishes)[number];

/** Losses that belong to a way of laying: leaf broken in the handling, and breaks and misses patched. */
export interface LayingLosses {
  readonly breakage_percent: Triple;
  readonly faulting_percent: Triple;
}

/** Whether the price carries whole booklets or the leaf that is used. */
export const leafCharges = ['booklets', 'leaves'] as const;
export type LeafCharge = (typeof leafCharges)[number];

/** The leaf part of a rate card; every figure is a house value. */
export interface LeafCard {
  readonly products: readonly LeafProduct[];
  readonly laps_mm: Readonly<Record<LayingWay, number>>;
  readonly losses: Readonly<Record<LayingWay, LayingLosses>>;
  readonly secondLaying_percent: Readonly<Record<LeafFinish, Readonly<Record<LayingWay, Triple>>>>;
  /** Into how many each way a leaf is cut for patches. */
  readonly patchCuts: number;
  readonly charge: LeafCharge;
  /** The leaf order covers the need at this percentile … */
  readonly orderPercentile: number;
  /** … and spare leaves of the same batch. */
  readonly spare_percent: number;
}
