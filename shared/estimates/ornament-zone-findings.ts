import type { Draft } from '#shared/estimates/draft';
import type { MeasuredMember, MeasuredZone } from '#shared/estimates/measured-member';
import type { MemberOrnament } from '#shared/estimates/member';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

interface Carved {
  readonly use: MemberOrnament;
  readonly name: string;
  /** Null for free carving, which has no relief on the card. */
  readonly relief: MemberOrnament['relief'] | null;
}

/** What is carved into a member's surface: ornaments and free carving; a blank that is shaped and work done once change nothing of it. */
function carvedOn({ member }: MeasuredMember, { carving }: RateCard): Carved[] {
  return member.ornaments.flatMap((use) => {
    const ornament = carving.ornaments.find(({ id }) => id === use.ornamentId);
    const free = carving.items.find(({ id, kind }) => id === use.ornamentId && kind === 'free');
    const named = ornament ?? free;
    return named ? [{ use, name: named.name, relief: ornament ? use.relief : null }] : [];
  });
}

const isBuiltUp = ({ zone }: MeasuredZone, { buildUps }: RateCard): boolean =>
  buildUps.buildUps.some(({ id }) => id === zone.buildUpId);

function inNoZone(measured: MeasuredMember, known: ReadonlySet<string>, card: RateCard): Finding[] {
  const { member, zones } = measured;
  if (!zones.some((zone) => isBuiltUp(zone, card))) return [];
  return carvedOn(measured, card)
    .filter(({ use }) => use.zoneId === null || !known.has(use.zoneId))
    .map(({ use, name: ornament }) => ({
      kind: 'warn',
      code: 'carving-in-no-zone',
      values: { ornament, member: member.name },
      about: use.id,
    }));
}

function inFlatZone(measured: MeasuredMember, card: RateCard): Finding[] {
  const { member, surface, zones } = measured;
  // What was measured in the round, or with its flutes, is the true surface already.
  if (surface.isTrueSurface || ('fluting' in member.shape && member.shape.fluting)) return [];
  const flat = new Map(zones.filter(({ zone }) => zone.relief === 'flat').map(({ zone }) => [zone.id, zone.name]));
  return carvedOn(measured, card).flatMap(({ use, name: ornament, relief }) => {
    const zone = flat.get(use.zoneId ?? '');
    if (zone === undefined || relief === null || relief === 'flat') return [];
    const values = { ornament, zone, member: member.name };
    return [{ kind: 'warn' as const, code: 'carving-zone-flat' as const, values, about: use.id }];
  });
}

/**
 * Ornament that stands in no zone though its member has some, and ornament in relief on a zone taken as flat: either would be worked as if the
 * surface were plain. `draft` is the whole of it, so that a zone of an alternative not chosen is known.
 */
export const ornamentZoneFindings = (
  members: readonly MeasuredMember[],
  draft: Draft,
  card: RateCard,
): readonly Finding[] => {
  const known = new Set(draft.members.flatMap(({ zones }) => zones.map(({ id }) => id)));
  return members.flatMap((measured) => [...inNoZone(measured, known, card), ...inFlatZone(measured, card)]);
};
