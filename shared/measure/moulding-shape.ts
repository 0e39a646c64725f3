import type { Fluted } from '#shared/measure/fluting';
import type { ProfileElement } from '#shared/measure/profile-element';

/** Lengths that do not meet, joined end to end for laying; each return turns back from an end at a right-angled outside mitre. */
export interface StraightPlan {
  readonly form: 'straight';
  readonly sides_mm: readonly number[];
  readonly returns_mm: readonly number[];
}

/** A circular sweep; 360° closes it. The radius is taken at the edge the plan is measured at. */
export interface ArcPlan {
  readonly form: 'arc';
  readonly radius_mm: number;
  readonly angle_degrees: number;
}

/** A whole oval by its two axes, taken at the edge the plan is measured at. */
export interface EllipsePlan {
  readonly form: 'ellipse';
  readonly length_mm: number;
  readonly width_mm: number;
}

/**
 * Straight sides meeting in mitres. A turn is how far the plan changes direction at a mitre (90° at a square corner), positive
 * where it turns as the corners of a box do, negative at a re-entrant one: as many as sides when closed, one fewer when open.
 */
export interface PolygonPlan {
  readonly form: 'polygon';
  readonly sides_mm: readonly number[];
  readonly turns_degrees: readonly number[];
  readonly closed: boolean;
}

export type MouldingPlan = StraightPlan | ArcPlan | EllipsePlan | PolygonPlan;

/** A moulding: a profile run along a plan, round the outside of it (a plinth) or inside it (a frame). */
export interface MouldingShape extends Fluted {
  readonly kind: 'moulding';
  readonly profile: readonly ProfileElement[];
  readonly plan: MouldingPlan;
  /** The edge of the profile at which the plan's lengths were measured: its least or its greatest projection. */
  readonly measuredAt: 'back' | 'front';
  readonly facing: 'outward' | 'inward';
}
