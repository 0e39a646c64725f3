import type { Ends } from '#shared/measure/ends';
import type { Fluted } from '#shared/measure/fluting';
import type { ProfileElement } from '#shared/measure/profile-element';

/** A turned piece: a profile read from the bottom up, revolved; `radius_mm` is the radius where the profile begins. */
export interface TurnedShape extends Fluted {
  readonly kind: 'turned';
  readonly profile: readonly ProfileElement[];
  readonly radius_mm: number;
  readonly ends: Ends;
}
