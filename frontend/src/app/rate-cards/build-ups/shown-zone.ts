import type { BuildUp, CoatSurface } from '#shared/buildups/buildup';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

/** The surfaces a build-up may go on, in the order they are offered. */
export const coatSurfaces: readonly { readonly surface: CoatSurface; readonly name: string }[] = [
  { surface: 'plain', name: $localize`plain` },
  { surface: 'moulded', name: $localize`moulded` },
  { surface: 'carved', name: $localize`carved` },
  { surface: 'recut', name: $localize`carved, recut in gesso` },
  { surface: 'frenchRecut', name: $localize`recut in the French manner` },
];

/** A zone of no size on which every step of a build-up is done, for drawing its layers. */
export function shownZone({ id, steps }: BuildUp, surface: CoatSurface): ZoneFacts {
  const isRecut = surface === 'recut' || surface === 'frenchRecut';
  return {
    ...{ id: 'shown', pieceId: 'shown', buildUpId: id, plan_mm2: 0, true_mm2: 0 },
    finish: isRecut ? 'carved' : surface,
    recutting: isRecut ? (surface === 'recut' ? 'plain' : 'french') : null,
    ...{ recutting_hours: 0, laying: null, paintedOrnament_mm2: 0, protectedEdge_mm: 0, burnished_percent: null },
    chosenStepIds: steps.filter(({ optional }) => optional).map((step) => step.id),
    ...{ lot: '', needsSeal: true, isRestoration: false, isOutdoorsOrWet: false },
  };
}
