import type { Ends } from '#shared/measure/ends';
import type { Fluted } from '#shared/measure/fluting';

/** A straight leg, tapered or not: width across the flats (square, octagonal) or diameter (round) at top and foot. */
export interface StraightLegShape extends Fluted {
  readonly kind: 'straight-leg';
  readonly section: 'square' | 'octagonal' | 'round';
  readonly length_mm: number;
  readonly top_mm: number;
  readonly foot_mm: number;
  readonly ends: Ends;
}

/** A leg by its girths at an odd number of equally spaced stations along its curved axis. */
export interface CabrioleShape extends Fluted {
  readonly kind: 'cabriole';
  readonly length_mm: number;
  readonly girths_mm: readonly number[];
}

export interface Station {
  readonly at_mm: number;
  readonly girth_mm: number;
}

/** A member by its girths at stations taken where they fall, in order along its curved axis. */
export interface StationsShape extends Fluted {
  readonly kind: 'stations';
  readonly stations: readonly Station[];
}

/** Section of a twisted member: a wavy round (mean radius, depth from crest to hollow) or a square across its flats. */
export type TwistedSection =
  | { readonly outline: 'lobed'; readonly radius_mm: number; readonly depth_mm: number; readonly lobes: number }
  | { readonly outline: 'square'; readonly across_mm: number };

/** A twisted (barley-sugar) member, turned evenly about its straight axis. */
export interface TwistedShape extends Fluted {
  readonly kind: 'twisted';
  readonly section: TwistedSection;
  readonly length_mm: number;
  readonly turns: number;
  readonly hand: 'left' | 'right';
}

/** One face of a ribbon winding round a core: a helicoid between two radii. */
export interface HelicoidShape {
  readonly kind: 'helicoid';
  readonly radius_mm: number;
  readonly coreRadius_mm: number;
  readonly risePerTurn_mm: number;
  readonly turns: number;
  readonly hand: 'left' | 'right';
}

export type LegShape = StraightLegShape | CabrioleShape | StationsShape | TwistedShape | HelicoidShape;
