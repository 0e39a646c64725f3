import { burnishedShare } from '#shared/buildups/burnished-share';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import type { BuildUpStep } from '#shared/buildups/buildup';
import type { ZoneFacts } from '#shared/buildups/zone-facts';

/** Share (0 to 1) of a zone's area a step goes on: all of it, or the burnished or the matte part. */
export function areaShare(step: BuildUpStep, facts: ZoneFacts, card: BuildUpCard): number {
  if (step.areaPart === 'all') return 1;
  const burnished = burnishedShare(facts, card);
  return step.areaPart === 'burnished' ? burnished : 1 - burnished;
}
