import type { Draft } from '#shared/estimates/draft';
import type { WorkFigures, ZoneFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';

/** Zones of the base that an alternative takes away, and those that stand in it instead. */
export interface AlternativeZones {
  readonly before: readonly ZoneFigures[];
  readonly after: readonly ZoneFigures[];
}

type Worked = Pick<WorkFigures, 'zones'>;
type IsMeant = (id: string, alternativeId: string | null) => boolean;

/** Zones that are meant by themselves, or with their member. */
function zonesOf({ members }: Draft, { zones }: Worked, isMeant: IsMeant): ZoneFigures[] {
  const ids = new Set(
    members.flatMap((member) =>
      member.zones
        .filter((zone) => isMeant(zone.id, zone.alternativeId) || isMeant(member.id, member.alternativeId))
        .map(({ id }) => id),
    ),
  );
  return zones.filter(({ zoneId }) => ids.has(zoneId));
}

/** The zones an alternative changes, worked: as the base has them, and as its own figures do; areas mm², hours decimal. */
export const alternativeZones = (
  draft: Draft,
  { id, replaces }: Alternative,
  { base, own }: { readonly base: Worked; readonly own: Worked | undefined },
): AlternativeZones => ({
  before: zonesOf(draft, base, (item, of) => of === null && replaces.includes(item)),
  after: own ? zonesOf(draft, own, (_, of) => of === id) : [],
});
