import type { PlanCurve } from '#shared/carving/plan-curve';
import type { Relief } from '#shared/measure/relief';

/** How much of an ornament one member carries: pieces, runs, or an area. */
export type OrnamentExtent =
  | { readonly way: 'pieces'; readonly count: number }
  | {
      readonly way: 'run';
      readonly run_mm: number;
      /** How many runs of this length, flutes side by side among them. */
      readonly runs: number;
      /** Length each mitre leaf takes off a run, and how many a run has. */
      readonly mitreLeaf_mm: number;
      readonly mitreLeaves: number;
      /** Length of the centrepiece; each half is then fitted apart. Null without one. */
      readonly centre_mm: number | null;
    }
  | { readonly way: 'area'; readonly area_mm2: number };

/** An ornament or carving item of the card as one member carries it. */
export interface OrnamentUse {
  readonly id: string;
  /** The id of an ornament or of an item of the card. */
  readonly ornamentId: string;
  readonly extent: OrnamentExtent;
  /** Nominal module of a piece; null takes the reference size. */
  readonly size_mm: number | null;
  readonly relief: Relief;
  readonly isUndercut: boolean;
  readonly plan: PlanCurve;
  /** The other hand of a pair; it joins the pair's learning only when `joinsLearning` is ticked. */
  readonly isMirrored: boolean;
  readonly joinsLearning: boolean;
  /** Its drawing differs from the ornament's other uses, so it needs a pattern of its own. */
  readonly hasOwnPattern: boolean;
  /** The zone it stands in, for recutting in gesso. */
  readonly zoneId: string | null;
}
