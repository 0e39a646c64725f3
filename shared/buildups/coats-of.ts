import type { BuildUpStep, CoatSurface } from '#shared/buildups/buildup';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

function coatSurface(facts: ZoneFacts): CoatSurface {
  if (facts.recutting === 'french') return 'frenchRecut';
  return facts.recutting === 'plain' ? 'recut' : facts.finish;
}

/** How many coats of a step a zone gets: by its finish, or by how it is recut. */
export const coatsOf = (step: BuildUpStep, facts: ZoneFacts): number => step.coats[coatSurface(facts)];
