import type { MaterialBought } from '#shared/buildups/materials-bought';
import type { RecipeBatch } from '#shared/buildups/recipe-batches';
import type { StripLayer } from '#shared/buildups/section-strip';
import type { StepHours } from '#shared/buildups/step-hours';
import type { CarvingHoursRow, CarvingResult, RecutHours, UseHours } from '#shared/carving/carving-result';
import type { DryFigures } from '#shared/estimates/dry-figures';
import type { PriceCost, PriceLines } from '#shared/estimates/price/price';
import type { Risk } from '#shared/estimates/risk/risk';
import type { LayPlanBand } from '#shared/leaf/lay-plan';
import type { LaysOption } from '#shared/leaf/lays-laying';
import type { LeafPurchase } from '#shared/leaf/leaf-purchase';
import type { LeafTotal } from '#shared/leaf/leaf-totals';
import type { ZoneLeaf } from '#shared/leaf/laying';
import type { SurfaceFinish } from '#shared/measure/relief';
import type { SurfacePart } from '#shared/measure/surface';
import type { DecimalText } from '#shared/money/decimal';
import type { StagePayments } from '#shared/money/stage-payments';
import type { Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** One member worked: developed surface of one, and of all identical ones the plan, true and bare surface and the hours. */
export interface MemberFigures {
  readonly memberId: string;
  readonly timber: string;
  readonly developed_mm2: number;
  readonly girth_mm: number | null;
  readonly run_mm: number | null;
  readonly uncertainty_mm2: number | null;
  readonly plan_mm2: number;
  readonly true_mm2: number;
  readonly bare_mm2: number;
  readonly parts: readonly SurfacePart[];
  readonly carving_hours: Triple;
  /** The same hours by stage and grade; patterns, sharpening and recutting stand apart, in the whole. */
  readonly carvingRows: readonly CarvingHoursRow[];
  readonly handsOn_hours: Triple;
  readonly reasons: readonly Reason[];
}

/** How one zone is laid. */
export interface ZoneLeafFigures extends Pick<
  ZoneLeaf,
  'productId' | 'way' | 'netLeaves' | 'grossLeaves' | 'handled' | 'reasons'
> {
  readonly name: string;
  readonly strips: number | null;
  readonly cuts: number | null;
  readonly lap_mm: number;
  readonly side_mm: number;
  /** What the lay plan of one member is drawn from; empty where nothing could be counted. */
  readonly bands: readonly LayPlanBand[];
}

/** One zone worked, over all identical members. */
export interface ZoneFigures {
  readonly zoneId: string;
  readonly memberId: string;
  readonly buildUp: string;
  readonly finish: SurfaceFinish;
  readonly plan_mm2: number;
  readonly true_mm2: number;
  readonly ground_mm: number;
  readonly hours: Triple;
  readonly steps: readonly Omit<StepHours, 'pattern' | 'perLaid_hours'>[];
  readonly layers: readonly StripLayer[];
  readonly leaf: ZoneLeafFigures | null;
  /** Recutting in gesso, which is counted with the carving; null where the zone is not recut. */
  readonly recutting: Pick<RecutHours, 'hours' | 'reasons'> | null;
  readonly reasons: readonly Reason[];
}

/** One ornament of a member worked. */
export interface UseFigures extends Pick<UseHours, 'useId' | 'quantity' | 'fit' | 'factor' | 'carving' | 'reasons'> {
  readonly memberId: string;
  readonly ornament: string;
}

/** Carving over the estimate, with the names of its stages. */
export interface CarvingFigures extends Pick<CarvingResult, 'rows' | 'total' | 'sharpening' | 'patterns' | 'reasons'> {
  readonly stages: readonly { readonly id: string; readonly name: string }[];
}

/** Leaf of one product over the estimate. */
export interface LeafFigures extends Pick<
  LeafTotal,
  'productId' | 'netLeaves' | 'grossLeaves' | 'booklets' | 'coverage' | 'mass_grams' | 'reasons'
> {
  readonly name: string;
  /** Of the job's own trials. */
  readonly grossLeaves_p10: number;
  readonly grossLeaves_p90: number;
}

/** Hours of one grade over the estimate, carving and gilding together, set-up included. */
export interface GradeFigures {
  readonly gradeId: string;
  readonly name: string;
  readonly hours: number;
}

/** The figures that stay in view while an estimate is worked. */
export interface Tally {
  readonly members: number;
  readonly true_mm2: number;
  readonly carving_hours: Triple;
  readonly handsOn_hours: Triple;
  readonly booklets: number;
  /** Of the job's own trials, all products together. */
  readonly booklets_p10: number;
  readonly booklets_p90: number;
  readonly workingDays: number;
  readonly weeks: number;
}

/** What the bench may see: no price, no cost, no rate. */
export interface WorkFigures {
  readonly calculatorVersion: number;
  readonly tally: Tally;
  readonly members: readonly MemberFigures[];
  readonly zones: readonly ZoneFigures[];
  readonly uses: readonly UseFigures[];
  readonly carving: CarvingFigures;
  readonly grades: readonly GradeFigures[];
  readonly leaf: readonly LeafFigures[];
  readonly materials: readonly Omit<MaterialBought, 'cost' | 'findings' | 'packs'>[];
  /** Sizes mixed from their recipes: for each piece one batch of each. */
  readonly batches: readonly RecipeBatch[];
  readonly dry: DryFigures;
  readonly findings: readonly Finding[];
}

/** What the office may see besides: prices, tax and stages. */
export interface PricedFigures extends WorkFigures {
  readonly price: PriceLines;
  readonly stages: StagePayments;
}

/** Leaf and materials as they are bought, and what that costs. */
export interface PurchaseFigures {
  readonly head: 'leaf' | 'materials';
  readonly itemId: string;
  readonly name: string;
  readonly cost: DecimalText;
  readonly leaf: LeafPurchase | null;
}

/** What only owner and estimator see. */
export interface CostFigures {
  readonly price: PriceCost;
  readonly purchases: readonly PurchaseFigures[];
  /** Ways to cut the leaf of a zone laid in strips, with what each costs. */
  readonly strips: readonly { readonly zoneId: string; readonly options: readonly LaysOption[] }[];
  readonly risk: Risk | null;
  readonly findings: readonly Finding[];
}

/** All figures of an estimate. */
export interface Figures extends PricedFigures {
  readonly cost: CostFigures;
}
