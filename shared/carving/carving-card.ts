import type { CarvingItem, Ornament } from '#shared/carving/ornament';
import type { PlanCurve } from '#shared/carving/plan-curve';
import type { Timber } from '#shared/carving/timber';
import type { Relief } from '#shared/measure/relief';

/** The two published ways to read a learning rate: of the n-th unit, or of the average of the first n. */
export const learningModels = ['unit', 'cumulative-average'] as const;
export type LearningModel = (typeof learningModels)[number];

export interface Learning {
  readonly model: LearningModel;
  /** What is left of the hours each time the count doubles, in percent. */
  readonly rate_percent: number;
  /** The piece after which hours stay the same: for single pieces, and for running ornament. */
  readonly plateauPieces: number;
  readonly plateauRunning: number;
}

/** A stage of carving: its share of repeated work in hundredths of a percent (1300 is 13 %), and who does it. */
export interface CarvingStage {
  readonly id: string;
  readonly name: string;
  readonly share_hundredths: number;
  readonly gradeId: string;
}

/** How the ground is recut in gesso: as usual, or the whole surface afresh in the French manner. */
export const recuttingManners = ['plain', 'french'] as const;
export type RecuttingManner = (typeof recuttingManners)[number];

export interface RecuttingRate {
  /** Share of the carving hours of the zone's ornaments. */
  readonly share_percent: number;
  /** Where the zone has no carving in this estimate. */
  readonly hours_per_m2: number;
}

/** The carving part of a rate card; every figure is a house value. */
export interface CarvingCard {
  readonly ornaments: readonly Ornament[];
  readonly items: readonly CarvingItem[];
  readonly timbers: readonly Timber[];
  readonly reliefFactors: Readonly<Record<Relief, number>>;
  /** Added when an ornament is undercut. */
  readonly undercut_percent: number;
  /** For carving the ornament on a curved plan. */
  readonly planFactors: Readonly<Record<PlanCurve, number>>;
  /** For working the plain moulding or block on a curved plan, before it is carved. */
  readonly blankPlanFactors: Readonly<Record<PlanCurve, number>>;
  /** Hours grow with this power of size ÷ reference. */
  readonly sizeExponent: number;
  readonly learning: Learning;
  readonly stretchTolerance_percent: number;
  readonly stages: readonly CarvingStage[];
  readonly undercuttingGradeId: string;
  readonly patternGradeId: string;
  readonly sharpening_percent: number;
  readonly recutting: Readonly<Record<RecuttingManner, RecuttingRate>> & { readonly gradeId: string };
}
