import type { Member, Zone } from '#shared/estimates/member';
import type { MeasureCard } from '#shared/measure/measure-card';
import { netAreas, type NetAreas, type ZoneArea } from '#shared/measure/net-areas';
import type { SurfaceFinish } from '#shared/measure/relief';
import type { Surface } from '#shared/measure/surface';
import { surfaceOf } from '#shared/measure/surface-of';
import type { Finding } from '#shared/words/finding';

/** What a zone takes of its member, and how worked its surface is. */
export interface MeasuredZone {
  readonly zone: Zone;
  readonly area: ZoneArea;
  readonly finish: SurfaceFinish;
}

/** A member's developed surface, in mm², with what its zones take of it. */
export interface MeasuredMember {
  readonly member: Member;
  readonly surface: Surface;
  readonly areas: NetAreas;
  readonly zones: readonly MeasuredZone[];
  readonly findings: readonly Finding[];
}

function finishOf(zone: Zone, member: Member, surface: Surface): SurfaceFinish {
  if (zone.finish) return zone.finish;
  const isCarved = zone.relief !== 'flat' || member.ornaments.some((use) => use.zoneId === zone.id);
  return isCarved ? 'carved' : surface.finish;
}

/** Developed surface of a member and the areas of its zones in mm², findings told of the member where they name no zone. */
export function measuredMember(member: Member, card: MeasureCard): MeasuredMember {
  const surface = surfaceOf(member.shape);
  const { openings, count, zones } = member;
  const areas = netAreas({ surface, openings, count, zones }, card);
  const measured = zones.flatMap((zone) => {
    const area = areas.zones.find((one) => one.id === zone.id);
    return area ? [{ zone, area, finish: finishOf(zone, member, surface) }] : [];
  });
  const findings = areas.findings.map((finding) => ({ about: member.id, ...finding }));
  return { member, surface, areas, zones: measured, findings };
}
