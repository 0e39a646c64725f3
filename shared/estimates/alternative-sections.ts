import { alternativeZones } from '#shared/estimates/alternative-zones';
import { buildUpsUsed, type UsedBuildUp } from '#shared/estimates/buildups-used';
import type { Draft } from '#shared/estimates/draft';
import type { WorkFigures, ZoneFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';

/** A build-up as its section strip draws it, with the wood beneath it. */
export interface AlternativeSection extends UsedBuildUp {
  readonly timber: string;
}

/** What an alternative takes away of the base, and what stands there instead, as sections through the layers. */
export interface AlternativeSections {
  readonly before: readonly AlternativeSection[];
  readonly after: readonly AlternativeSection[];
}

type Worked = Pick<WorkFigures, 'zones' | 'members'>;

/** What the wood of zones is called, by their members; each name once. */
function timberOf({ members }: Worked, zones: readonly ZoneFigures[], zoneIds: readonly string[]): string {
  const memberIds = new Set(zones.filter(({ zoneId }) => zoneIds.includes(zoneId)).map(({ memberId }) => memberId));
  const timbers = members.filter(({ memberId }) => memberIds.has(memberId)).map(({ timber }) => timber);
  return [...new Set(timbers)].join(', ');
}

const sectionsOf = (figures: Worked, zones: readonly ZoneFigures[]): AlternativeSection[] =>
  buildUpsUsed(zones).map((used) => ({ ...used, timber: timberOf(figures, zones, used.zoneIds) }));

/** The sections an alternative changes, of its own figures beside those of the base; thickness as in the section strip. */
export function alternativeSections(
  draft: Draft,
  alternative: Alternative,
  { base, own }: { readonly base: Worked; readonly own: Worked },
): AlternativeSections {
  const { before, after } = alternativeZones(draft, alternative, { base, own });
  return { before: sectionsOf(base, before), after: sectionsOf(own, after) };
}
