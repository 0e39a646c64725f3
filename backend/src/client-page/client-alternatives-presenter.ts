import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { alternativeZones } from '#shared/estimates/alternative-zones';
import { buildUpsUsed, type UsedBuildUp } from '#shared/estimates/buildups-used';
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

/** An alternative beside the base: what it comes to, how long it takes, and the strips of what it brings and takes away. */
export function presentClientAlternative(
  snapshot: Snapshot,
  alternative: Alternative,
  own: Figures | undefined,
): Shown {
  const { id, name, group, note, replaces } = alternative;
  const total = snapshot.alternatives.find((one) => one.id === id);
  const { before, after } = alternativeZones(snapshot.draft, alternative, { base: snapshot.figures, own });
  return {
    ...{ id, name, group, note, replaces: [...replaces] },
    gross_minor: total?.gross_minor ?? snapshot.figures.price.gross_minor,
    difference_minor: total?.difference_minor ?? 0,
    weeks: countUp((own ?? snapshot.figures).tally.weeks),
    before: stripsOf(before),
    after: stripsOf(after),
  };
}
