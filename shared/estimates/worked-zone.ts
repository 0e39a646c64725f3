import type { BuildUp } from '#shared/buildups/buildup';
import { burnishedShare } from '#shared/buildups/burnished-share';
import { laidGroundOf } from '#shared/buildups/laid-ground-of';
import { layingCounts } from '#shared/buildups/laying-counts';
import { minutesPerLaid } from '#shared/buildups/minutes-per-laid';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import { zoneFindings } from '#shared/buildups/zone-findings';
import { zoneHandsOn, type ZoneHandsOn } from '#shared/buildups/zone-hands-on';
import { zoneMaterials, type ZoneMaterials } from '#shared/buildups/zone-materials';
import type { MeasuredMember, MeasuredZone } from '#shared/estimates/measured-member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { needsSeal } from '#shared/leaf/leaf-findings';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { zoneLeaf } from '#shared/leaf/zone-leaf';
import type { ZoneLeaf } from '#shared/leaf/laying';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { Finding } from '#shared/words/finding';

/** One zone worked through: what it takes, its leaf, hands-on work and materials. */
export interface WorkedZone extends MeasuredZone {
  readonly memberId: string;
  readonly pieceId: string;
  readonly buildUp: BuildUp | null;
  readonly facts: ZoneFacts;
  readonly leaf: ZoneLeaf | null;
  readonly handsOn: ZoneHandsOn;
  readonly materials: ZoneMaterials;
  readonly findings: readonly Finding[];
}

/** Where a zone stands: its member, the estimate's settings, the rate card, and recutting hours the carving worked for it. */
export interface ZoneAt {
  readonly measured: MeasuredMember;
  readonly settings: Pick<EstimateSettings, 'place' | 'restoration'>;
  readonly card: RateCard;
  readonly recutting_hours: number;
}

interface Laid {
  readonly product: LeafProduct | undefined;
  readonly laying: ZoneFacts['laying'];
}

const factsOf = ({ zone, area, finish }: MeasuredZone, at: ZoneAt, { product, laying }: Laid): ZoneFacts => ({
  id: zone.id,
  pieceId: at.measured.member.pieceId,
  buildUpId: zone.buildUpId,
  lot: at.measured.member.lot,
  plan_mm2: area.plan_mm2,
  true_mm2: area.net_mm2,
  finish,
  recutting: zone.recutting,
  recutting_hours: at.recutting_hours,
  laying,
  paintedOrnament_mm2: (area.plan_mm2 * zone.painted_percent) / 100,
  protectedEdge_mm: zone.protectedEdge_mm * at.measured.member.count,
  burnished_percent: zone.burnished_percent,
  chosenStepIds: zone.chosenStepIds,
  needsSeal: product !== undefined && needsSeal(product),
  isRestoration: at.settings.restoration,
  isOutdoorsOrWet: at.settings.place !== 'indoors',
});

/** What the hand that lays costs for one strip, so that strips can be weighed against leaf. */
function pieceCost(
  buildUp: BuildUp,
  facts: ZoneFacts,
  { product, card }: { product: LeafProduct; card: RateCard },
): number {
  const laying = { way: 'lays' as const, form: product.form, counts: { first: 0, faulting: 0, second: 0 } };
  const minutes = minutesPerLaid({ finish: facts.finish, laying }, buildUp.system, card.buildUps.laying);
  const gradeId = buildUp.steps.find((step) => step.kind === 'lay')?.gradeId;
  const grade = card.money.grades.find((known) => known.id === gradeId);
  return (minutes / 60) * Number(grade?.costPerHour ?? 0);
}

function leafOf(
  zone: MeasuredZone,
  at: ZoneAt,
  known: { buildUp: BuildUp; facts: ZoneFacts; product: LeafProduct },
): ZoneLeaf | null {
  const ground = laidGroundOf(known.buildUp);
  if (!ground) return null;
  const { laying, take } = zone.zone;
  const input = {
    zoneId: zone.zone.id,
    productId: known.product.id,
    ground,
    surface: at.measured.surface,
    partKeys: take.way === 'parts' ? take.parts : null,
    share: take.way === 'share' ? take.share_percent / 100 : 1,
    // Pierced work takes its edges into the factor, so nothing is deducted from it.
    openings_mm2: zone.zone.relief === 'pierced' ? 0 : at.measured.areas.openingsEach_mm2,
    members: at.measured.member.count,
    relief: zone.zone.relief,
    reliefFactor: zone.area.reliefFactor,
    finish: zone.finish,
    burnishedShare: burnishedShare(known.facts, at.card.buildUps),
    way: laying.way === 'proposed' ? null : laying.way,
    strips: laying.strips,
    cuts: laying.cuts,
    pieceCost: pieceCost(known.buildUp, known.facts, { product: known.product, card: at.card }),
  };
  return zoneLeaf(input, at.card.leaf);
}

function layingOf(leaf: ZoneLeaf, product: LeafProduct): ZoneFacts['laying'] {
  const { faulting_percent, second_percent } = leaf.losses;
  const counts = layingCounts(leaf.handled.likely, faulting_percent.likely / 100, second_percent.likely / 100);
  return { way: leaf.way, form: product.form, counts };
}

function missingFindings(zone: MeasuredZone, at: ZoneAt, buildUp: BuildUp | undefined): Finding[] {
  const about = zone.zone.id;
  if (!buildUp || !laidGroundOf(buildUp)) return [];
  const isKnown = at.card.leaf.products.some((product) => product.id === zone.zone.leafId);
  return isKnown ? [] : [{ kind: 'missing', code: 'zone-leaf-missing', values: { zone: zone.zone.name }, about }];
}

/** Leaf, hands-on hours and materials of one zone over all identical members; what the card does not hold or the trade forbids is a finding. */
export function workedZone(zone: MeasuredZone, at: ZoneAt): WorkedZone {
  const buildUp = at.card.buildUps.buildUps.find((known) => known.id === zone.zone.buildUpId);
  const product = at.card.leaf.products.find((known) => known.id === zone.zone.leafId);
  const plain = factsOf(zone, at, { product, laying: null });
  const leaf = buildUp && product ? leafOf(zone, at, { buildUp, facts: plain, product }) : null;
  const facts = leaf && product ? factsOf(zone, at, { product, laying: layingOf(leaf, product) }) : plain;
  const handsOn = zoneHandsOn(facts, at.card.buildUps);
  const materials = buildUp ? zoneMaterials(buildUp, facts, at.card.buildUps) : { needs: [], findings: [] };
  const own = buildUp ? zoneFindings(buildUp, facts, at.card.buildUps) : [];
  const findings = [
    ...missingFindings(zone, at, buildUp),
    ...(leaf?.findings ?? []),
    ...handsOn.findings,
    ...materials.findings,
    ...own,
  ];
  const { id: memberId, pieceId } = at.measured.member;
  const { zone: entry, area, finish } = zone;
  const whole = buildUp ?? null;
  return { zone: entry, area, finish, memberId, pieceId, buildUp: whole, facts, leaf, handsOn, materials, findings };
}
