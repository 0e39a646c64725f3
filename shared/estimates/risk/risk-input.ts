import type { MinorUnits } from '#shared/money/decimal';
import type { Triple } from '#shared/units/triple';

/**
 * One uncertain figure of the job: the hours of a pattern, the spread of hands-on gilding, a loss. Drawn once per trial whatever the
 * number of rows or pieces that hang on it. Draws are made in the order of their keys, however they are listed.
 */
export interface RiskDraw {
  readonly key: string;
  readonly triple: Triple;
}

/** Hours that follow a draw: hours = draw × hoursPerUnit, cost = draw × costPerUnit_minor (both may be blends over grades). */
export interface RiskHours {
  readonly drawKey: string;
  readonly hoursPerUnit: number;
  readonly costPerUnit_minor: number;
}

/** Leaf of one product on zones of one way of laying and finish: net leaves and the keys of the losses drawn for them. */
export interface RiskLeafUse {
  readonly netLeaves: number;
  readonly breakageKey: string;
  readonly faultingKey: string;
  /** Each finish is laid again on its share (0…1) of the zone. */
  readonly secondLayings: readonly { readonly key: string; readonly share: number }[];
  /** Laying goes by gross leaves: hours a leaf, their cost, and the draw (a factor) that spreads them, if any. */
  readonly hoursPerLeaf: number;
  readonly costPerLeaf_minor: number;
  readonly spreadKey: string | null;
}

/** One leaf product: how it is bought, and where it goes. */
export interface RiskLeaf {
  readonly productId: string;
  readonly leavesPerBooklet: number;
  /** What 0, 1, 2 … booklets cost; beyond the end every further booklet costs what the last step did. At least two entries. */
  readonly bookletCosts_minor: readonly number[];
  readonly uses: readonly RiskLeafUse[];
}

/** All that risk is worked from. Losses are fractions (0.05), not percent. */
export interface RiskInput {
  readonly seed: number;
  readonly distribution: 'triangular' | 'pert';
  /** c, 0…1: how much of the luck is shared by all inputs. */
  readonly commonFactor: number;
  /** The percentile contingency is taken at, above 0 and at most 100. */
  readonly percentile: number;
  readonly draws: readonly RiskDraw[];
  readonly hours: readonly RiskHours[];
  readonly leaf: readonly RiskLeaf[];
  /** Hours and direct cost that no draw moves. */
  readonly fixedHours: number;
  readonly fixed_minor: MinorUnits;
}
