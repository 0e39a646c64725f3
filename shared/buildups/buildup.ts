import type { SurfaceFinish } from '#shared/measure/relief';
import type { Triple } from '#shared/units/triple';

/** What a zone is finished with. Mercury (fire) gilding is not among them and never will be. */
export const systems = ['water', 'oil', 'water-borne-size', 'paint', 'glaze', 'bare'] as const;
export type System = (typeof systems)[number];

/** How a step dries: in water, by taking up oxygen, or as its spirit leaves. */
export const climateModels = ['water', 'oil', 'spirit'] as const;
export type ClimateModel = (typeof climateModels)[number];

/** What is done in a step, in the trade's words. */
export const stepKinds = [
  'clean',
  'consolidate',
  'size-coat',
  'gesso',
  'recut',
  'smooth',
  'bole',
  'polish-bole',
  'sealer',
  'coloured-ground',
  'oil-size',
  'lay',
  'skew-off',
  'fault',
  'second-laying',
  'leave',
  'burnish',
  'matte-size',
  'seal',
  'tone',
  'isolate',
  'transfer-drawing',
  'glaze',
  'varnish',
  'paint',
  'protect-edge',
] as const;
export type StepKind = (typeof stepKinds)[number];

/** What can hurt somebody in a step; `glue-heat` is a note of craft. */
export const cautionNames = [
  'wood-dust',
  'whiting-dust',
  'silica',
  'lead',
  'solvents',
  'spirit-near-heat',
  'isocyanates',
  'oily-rags',
  'glue-allergy',
  'glue-heat',
] as const;
export type CautionName = (typeof cautionNames)[number];

/** Steps that wait for somebody's approval before they start. */
export const holdPoints = ['carving-approved', 'sample-approved', 'top-dry-fitted'] as const;
export type HoldPoint = (typeof holdPoints)[number];

/** What the trade does when a window was missed. */
export const missedWindows = ['revive-or-relay', 'new-size', 'key-and-recoat', 'strip-ground', 'tarnished'] as const;
export type MissedWindow = (typeof missedWindows)[number];

/** Coats by the surface they go on: finished work plain, moulded or carved, carving that is recut afterwards, and recut in the French manner. */
export type CoatSurface = SurfaceFinish | 'recut' | 'frenchRecut';
export type Coats = Readonly<Record<CoatSurface, number>>;

/**
 * How the hands-on time of a step is counted: hours per m² plan and coat (with the finish factors, those of smoothing, or none), by the
 * leaves laid, from the card's own triples, from the carving (recutting), by the edge protected, or not at all (a step that only waits).
 */
export type StepWork =
  | { readonly way: 'area'; readonly hours_m2: number; readonly factors: 'finish' | 'smoothing' | 'none' }
  | { readonly way: 'laying'; readonly part: 'first' | 'faulting' | 'second' }
  | { readonly way: 'consolidating' | 'cleaning' | 'recutting' | 'edge' | 'waiting' };

/** What one coat takes of a material, or of a recipe of the card, per m² of true surface; `share` is the share of the coats it serves (1 = all). */
export type MaterialUse = (
  | { readonly way: 'grams'; readonly grams_m2: number }
  | { readonly way: 'coverage'; readonly coverage_m2_L: number }
  | { readonly way: 'litres'; readonly litres_m2: number }
) & {
  readonly of: 'material' | 'recipe';
  readonly itemId: string;
  readonly loss_percent: number;
  readonly share: number;
};

/** A lag to a step further on: least time from end to start (scales), or to be finished within so long of this step's start (never scales). */
export interface StepLag {
  readonly toStepId: string;
  readonly least_minutes: number | null;
  readonly finishedWithin_minutes: number | null;
}

/**
 * Drying of a step at 20 °C and 50 % RH. Times run from the end of a coat or step to the start of the next; both ends of a window scale with
 * the climate, the two `within` rules do not. A window of null stands open.
 */
export interface StepDrying {
  readonly model: ClimateModel;
  readonly betweenCoats_minutes: Triple;
  /** Latest start of the next coat, from the end of the last. */
  readonly latestCoat_minutes: number | null;
  readonly beforeNext_minutes: Triple;
  /** How long the next step may still start once it may start at all. */
  readonly window_minutes: number | null;
  /** The next step has to end, not only start, inside the window, so the work is done in portions. */
  readonly endsInWindow: boolean;
  /** All coats of the step, from its start to its end; never scales. */
  readonly wholeWithin_minutes: number | null;
  readonly lags: readonly StepLag[];
  readonly missed: MissedWindow | null;
}

/** One step of a build-up, in working order. `areaPart` says whether it goes on all of a zone or its burnished or matte part only. */
export interface BuildUpStep {
  readonly id: string;
  readonly kind: StepKind;
  readonly name: string;
  readonly coats: Coats;
  readonly areaPart: 'all' | 'burnished' | 'matte';
  readonly work: StepWork;
  readonly gradeId: string;
  readonly uses: readonly MaterialUse[];
  readonly drying: StepDrying;
  readonly groundPerCoat_mm: number;
  readonly cautions: readonly CautionName[];
  readonly holds: readonly HoldPoint[];
  /** Only done where the zone asks for it, or where the leaf needs a seal. */
  readonly optional: boolean;
  /** What colour the step shows in the section strip. */
  readonly colour: LayerColour;
  /** Where its figures come from, in words; "house" where they are the workshop's own. */
  readonly note: string;
}

/** A colour of the section strip; `none` for a step that leaves no layer. */
export const layerColours = [
  'none',
  'wood',
  'size',
  'gesso',
  'yellow-bole',
  'red-bole',
  'leaf',
  'oil-size',
  'shellac',
  'coloured-ground',
  'tone',
  'white',
  'glaze',
  'varnish',
  'paint',
] as const;
export type LayerColour = (typeof layerColours)[number];

/** The ordered coats and operations on a zone. */
export interface BuildUp {
  readonly id: string;
  readonly name: string;
  readonly system: System;
  readonly steps: readonly BuildUpStep[];
  readonly note: string;
}
