import type { MemberContent } from '#shared/estimates/member';
import { newId } from '../../core/new-id';

/** A copy whose zones, ornaments and openings are its own: new ids throughout, pointing at each other as the old ones did. */
export function copiedMember(content: MemberContent): MemberContent {
  const zoneIds = new Map(content.zones.map(({ id }) => [id, newId()]));
  return {
    ...content,
    openings: content.openings.map((opening) => ({ ...opening, id: newId() })),
    zones: content.zones.map((zone) => ({ ...zone, id: zoneIds.get(zone.id) ?? newId() })),
    ornaments: content.ornaments.map((use) => ({
      ...use,
      id: newId(),
      zoneId: use.zoneId === null ? null : (zoneIds.get(use.zoneId) ?? null),
    })),
  };
}
