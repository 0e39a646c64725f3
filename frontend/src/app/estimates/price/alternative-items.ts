import type { Draft } from '#shared/estimates/draft';

/** Something of the base that an alternative may take the place of, or that stands in an alternative alone. */
export interface ReplaceableItem {
  readonly id: string;
  readonly kind: 'member' | 'zone' | 'ornament' | 'extra';
  readonly name: string;
  /** The member a zone or an ornament is of. */
  readonly memberId: string | null;
}

type OrnamentName = (ornamentId: string) => string;

/** Everything of the base, members with what stands in them, then the further lines. */
export function replaceableItems({ members, settings }: Draft, ornamentName: OrnamentName): ReplaceableItem[] {
  const ofMembers = members
    .filter(({ alternativeId }) => alternativeId === null)
    .flatMap((member): ReplaceableItem[] => [
      { id: member.id, kind: 'member', name: member.name, memberId: null },
      ...member.zones
        .filter(({ alternativeId }) => alternativeId === null)
        .map(({ id, name }): ReplaceableItem => ({ id, kind: 'zone', name, memberId: member.id })),
      ...member.ornaments
        .filter(({ alternativeId }) => alternativeId === null)
        .map(({ id, ornamentId }): ReplaceableItem => ({
          ...{ id, kind: 'ornament', name: ornamentName(ornamentId) },
          memberId: member.id,
        })),
    ]);
  const extras = settings.extras
    .filter(({ alternativeId }) => alternativeId === null)
    .map(({ id, name }): ReplaceableItem => ({ id, kind: 'extra', name, memberId: null }));
  return [...ofMembers, ...extras];
}

/** What belongs to an alternative: its members, zones and ornaments in other members, its lines. */
export function itemsOfAlternative(
  { members, settings }: Draft,
  alternativeId: string,
  ornamentName: OrnamentName,
): ReplaceableItem[] {
  const own = (item: { readonly alternativeId: string | null }) => item.alternativeId === alternativeId;
  const inMembers = members.flatMap((member): ReplaceableItem[] => {
    if (own(member)) return [{ id: member.id, kind: 'member', memberId: member.id, name: member.name }];
    const zones = member.zones.filter(own).map(({ id, name }) => ({ id, name, kind: 'zone' as const }));
    const ornaments = member.ornaments
      .filter(own)
      .map(({ id, ornamentId }) => ({ id, name: ornamentName(ornamentId), kind: 'ornament' as const }));
    return [...zones, ...ornaments].map((item) => ({
      ...item,
      memberId: member.id,
      name: `${member.name}, ${item.name}`,
    }));
  });
  const extras = settings.extras
    .filter(own)
    .map(({ id, name }): ReplaceableItem => ({ id, kind: 'extra', memberId: null, name }));
  return [...inMembers, ...extras];
}
