import type { BuildUp } from '#shared/buildups/buildup';
import type { LaidGround } from '#shared/leaf/laid-ground';
import type { LeafFinish } from '#shared/leaf/leaf-card';

function finishOf(buildUp: BuildUp): LeafFinish {
  if (buildUp.system !== 'water') return 'oil';
  const burnish = buildUp.steps.find((step) => step.kind === 'burnish');
  if (!burnish) return 'water-matte';
  return burnish.areaPart === 'burnished' ? 'water-burnished-and-matte' : 'water-burnished';
}

/** What leaf has to know of a build-up it is laid in; null where no leaf is laid. A build-up with a seal step is sealed: an optional one is done where leaf needs it. */
export function laidGroundOf(buildUp: BuildUp): LaidGround | null {
  const { system, steps } = buildUp;
  if (system !== 'water' && system !== 'oil' && system !== 'water-borne-size') return null;
  if (!steps.some((step) => step.kind === 'lay')) return null;
  return { system, finish: finishOf(buildUp), isSealed: steps.some((step) => step.kind === 'seal') };
}
