import type { Zone } from '#shared/estimates/member';
import type { ZoneTake } from '#shared/measure/zone-take';
import type { RateCard } from '#shared/rate-cards/rate-card';

/** A zone for what the others leave; it is gilt as the last one is, or as the card begins. */
export function newZone(start: { id: string; name: string }, zones: readonly Zone[], card: RateCard | undefined): Zone {
  const last = zones.at(-1);
  return {
    relief: 'flat',
    finish: null,
    buildUpId: card?.buildUps.buildUps.at(0)?.id ?? '',
    leafId: card?.leaf.products.at(0)?.id ?? null,
    laying: { way: 'proposed', strips: null, cuts: null },
    chosenStepIds: [],
    burnished_percent: null,
    painted_percent: 0,
    recutting: null,
    protectedEdge_mm: 0,
    ...last,
    ...start,
    take: restOf(zones),
    alternativeId: null,
  };
}

function restOf(zones: readonly Zone[]): ZoneTake {
  if (zones.some(({ take }) => take.way === 'parts')) return { way: 'parts', parts: [] };
  const shares = zones
    .filter(({ alternativeId }) => alternativeId === null)
    .reduce((sum, { take }) => sum + (take.way === 'share' ? take.share_percent : 0), 0);
  return { way: 'share', share_percent: Math.max(0, Math.round((100 - shares) * 1e6) / 1e6) };
}
