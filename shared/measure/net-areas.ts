import { because } from '#shared/measure/made-surface';
import type { MeasureCard } from '#shared/measure/measure-card';
import type { ZonedMember, MemberZone } from '#shared/measure/zoned-member';
import { netAreaFindings } from '#shared/measure/net-area-findings';
import { openingsArea } from '#shared/measure/openings-area';
import type { Relief } from '#shared/measure/relief';
import { reliefFactor } from '#shared/measure/relief-factor';
import { zoneShare } from '#shared/measure/zone-share';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** What a zone comes to: areas in mm², of one member and of all alike; plan for hands-on work, net (with relief) for material and leaf. */
export interface ZoneArea {
  readonly id: string;
  /** 0…1 of the member's surface. */
  readonly share: number;
  /** Girth of the parts it takes by themselves. */
  readonly girth_mm?: number;
  readonly reliefFactor: number;
  readonly planEach_mm2: number;
  readonly netEach_mm2: number;
  readonly plan_mm2: number;
  readonly net_mm2: number;
  readonly reasons: readonly Reason[];
}

/** Areas of a member's zones and what is left bare, in mm² of all alike, with what there is to tell. */
export interface NetAreas {
  readonly openingsEach_mm2: number;
  /** Developed surface less openings. */
  readonly plan_mm2: number;
  readonly bare_mm2: number;
  readonly zones: readonly ZoneArea[];
  readonly findings: readonly Finding[];
}

interface Field {
  readonly member: ZonedMember;
  readonly openings_mm2: number;
  readonly card: MeasureCard;
}

function fieldReasons({ member, openings_mm2 }: Field, relief: Relief): Reason[] {
  const developed = because('measure-developed', [member.surface.area_mm2, 'mm2']);
  if (openings_mm2 === 0) return [developed];
  if (relief === 'pierced') return [developed, because('measure-pierced-whole', [member.surface.area_mm2, 'mm2'])];
  const count = member.openings.reduce((sum, opening) => sum + opening.count, 0);
  return [developed, because('measure-openings', [openings_mm2, 'mm2'], { count })];
}

function zoneArea({ id, take, relief }: MemberZone, field: Field): ZoneArea {
  const { surface, count } = field.member;
  // Pierced work takes its edges into the factor, so nothing is deducted from it.
  const whole_mm2 = surface.area_mm2 - (relief === 'pierced' ? 0 : field.openings_mm2);
  const taken = zoneShare(take, surface);
  const factor = reliefFactor(relief, surface.isTrueSurface, field.card);
  const planEach_mm2 = Math.max(0, whole_mm2) * taken.share;
  const [plan_mm2, net_mm2] = [planEach_mm2 * count, planEach_mm2 * count * factor.figure];
  return {
    id,
    ...taken,
    reliefFactor: factor.figure,
    planEach_mm2,
    netEach_mm2: planEach_mm2 * factor.figure,
    plan_mm2,
    net_mm2,
    reasons: [
      ...fieldReasons(field, relief),
      taken.girth_mm === undefined
        ? because('measure-zone-share', [taken.share * 100, 'percent'])
        : because('measure-zone-parts', [taken.share * 100, 'percent'], { girth_mm: taken.girth_mm }),
      because('measure-members', [count, 'pieces']),
      because('measure-plan-area', [plan_mm2, 'mm2']),
      factor,
      because('measure-net', [net_mm2, 'mm2']),
    ],
  };
}

/**
 * Net areas of a member's zones in mm²: (developed − openings) × count × share × relief factor. Openings above the surface, shares
 * above 100 % and parts taken twice are refused as findings; what no zone takes stays bare and is told.
 */
export function netAreas(member: ZonedMember, card: MeasureCard): NetAreas {
  const openings_mm2 = openingsArea(member.openings);
  const plan_mm2 = Math.max(0, member.surface.area_mm2 - openings_mm2) * member.count;
  const zones = member.zones.map((zone) => zoneArea(zone, { member, openings_mm2, card }));
  const taken = zones.reduce((sum, zone) => sum + zone.share, 0);
  const bare_mm2 = taken > 1 - 1e-9 ? 0 : plan_mm2 * (1 - taken);
  return {
    openingsEach_mm2: openings_mm2,
    plan_mm2,
    bare_mm2,
    zones,
    findings: netAreaFindings(member, { openings_mm2, taken, bare_mm2 }),
  };
}
