import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { buildUpsUsed, type UsedBuildUp } from '#shared/documents/buildups-used';
import type { Figures, ZoneFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';
import type { Snapshot } from '#shared/estimates/snapshot';
import { countUp } from '#shared/money/settled';

type Shown = ClientIssue['alternatives'][number];

/** The layers of a strip as they are drawn. */
export const presentBuildUp = ({ buildUp, zoneIds, leaf, layers }: UsedBuildUp): ClientIssue['buildUps'][number] => ({
  buildUp,
  zoneIds: [...zoneIds],
  leaf: [...leaf],
  layers: layers.map(({ stepId, name, coats, colour, thickness, thickness_mm }) => ({
    ...{ stepId, name, colour, thickness, thickness_mm },
    coats: [coats[0], coats[1]],
  })),
});

const stripsOf = (zones: readonly ZoneFigures[]) => buildUpsUsed(zones).map(presentBuildUp);

/** Zones that belong to an alternative: by themselves, or with their member. */
function zonesOf({ draft }: Snapshot, figures: Figures, isIts: (id: string, alternativeId: string | null) => boolean) {
  const ids = new Set(
    draft.members.flatMap((member) =>
      member.zones
        .filter((zone) => isIts(zone.id, zone.alternativeId) || isIts(member.id, member.alternativeId))
        .map(({ id }) => id),
    ),
  );
  return figures.zones.filter(({ zoneId }) => ids.has(zoneId));
}

/** An alternative beside the base: what it comes to, how long it takes, and the strips of what it brings and takes away. */
export function presentClientAlternative(
  snapshot: Snapshot,
  alternative: Alternative,
  own: Figures | undefined,
): Shown {
  const { id, name, group, note, replaces } = alternative;
  const total = snapshot.alternatives.find((one) => one.id === id);
  const before = zonesOf(snapshot, snapshot.figures, (item, of) => of === null && replaces.includes(item));
  const after = own ? zonesOf(snapshot, own, (_, of) => of === id) : [];
  return {
    ...{ id, name, group, note, replaces: [...replaces] },
    gross_minor: total?.gross_minor ?? snapshot.figures.price.gross_minor,
    difference_minor: total?.difference_minor ?? 0,
    weeks: countUp((own ?? snapshot.figures).tally.weeks),
    before: stripsOf(before),
    after: stripsOf(after),
  };
}
