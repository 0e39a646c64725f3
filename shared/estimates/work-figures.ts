import { groundThickness } from '#shared/buildups/ground-thickness';
import { recipeBatches } from '#shared/buildups/recipe-batches';
import { sectionStrip } from '#shared/buildups/section-strip';
import type { StepHours } from '#shared/buildups/step-hours';
import type { RecutHours, UseHours } from '#shared/carving/carving-result';
import { rowsTogether } from '#shared/carving/hours-of-kinds';
import { calculatorVersion } from '#shared/estimates/calculator-version';
import { dryFigures } from '#shared/estimates/dry-figures';
import type { EstimateWork } from '#shared/estimates/estimate-work';
import type {
  CarvingFigures,
  GradeFigures,
  LeafFigures,
  MemberFigures,
  Tally,
  UseFigures,
  WorkFigures,
  ZoneFigures,
  ZoneLeafFigures,
} from '#shared/estimates/figures';
import type { MeasuredMember } from '#shared/estimates/measured-member';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { WorkedZone } from '#shared/estimates/worked-zone';
import { layPlanBands } from '#shared/leaf/lay-plan-bands';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { groupedBy } from '#shared/units/grouped-by';
import { tripleSum } from '#shared/units/triple-sum';

const nameOf = (items: readonly { readonly id: string; readonly name: string }[], id: string): string =>
  items.find((item) => item.id === id)?.name ?? id;

const sum = (figures: readonly number[]): number => figures.reduce((total, figure) => total + figure, 0);

/** What was worked of one member: its zones and its ornaments. */
interface MemberWork {
  readonly zones: readonly WorkedZone[];
  readonly uses: readonly UseHours[];
}

function memberFigures(measured: MeasuredMember, { zones, uses }: MemberWork, card: RateCard): MemberFigures {
  const { member, surface, areas } = measured;
  return {
    memberId: member.id,
    timber: nameOf(card.carving.timbers, member.timberId),
    developed_mm2: surface.area_mm2,
    girth_mm: surface.girth_mm ?? null,
    run_mm: surface.run_mm ?? null,
    uncertainty_mm2: surface.uncertainty_mm2 ?? null,
    plan_mm2: areas.plan_mm2,
    true_mm2: sum(areas.zones.map((zone) => zone.net_mm2)) + areas.bare_mm2,
    bare_mm2: areas.bare_mm2,
    parts: surface.parts,
    carving_hours: tripleSum(uses.map((use) => use.carving)),
    carvingRows: rowsTogether(uses.flatMap((use) => use.rows)),
    handsOn_hours: tripleSum(zones.map((zone) => zone.handsOn.hours)),
    reasons: surface.reasons,
  };
}

function zoneLeafFigures({ leaf }: WorkedZone, card: RateCard): ZoneLeafFigures | null {
  const product = card.leaf.products.find((known) => known.id === leaf?.productId);
  if (!leaf || !product) return null;
  const { productId, way, netLeaves, grossLeaves, handled, reasons, laying } = leaf;
  const step = { side_mm: product.side_mm, lap_mm: card.leaf.laps_mm[way] };
  return {
    ...{ productId, way, netLeaves, grossLeaves, handled, reasons },
    name: product.name,
    strips: laying?.way === 'lays' ? laying.chosen.strips : null,
    cuts: laying?.way === 'patches' ? laying.cuts : null,
    ...step,
    bands: laying ? layPlanBands(laying, step) : [],
  };
}

function stepFigures({ stepId, kind, name, gradeId, coats, hours, reasons }: StepHours): ZoneFigures['steps'][number] {
  return { stepId, kind, name, gradeId, coats, hours, reasons };
}

function zoneFigures(worked: WorkedZone, recut: RecutHours | undefined, card: RateCard): ZoneFigures {
  const { zone, area, buildUp, facts } = worked;
  const metal = card.leaf.products.find((product) => product.id === zone.leafId)?.metal ?? null;
  return {
    zoneId: zone.id,
    memberId: worked.memberId,
    buildUp: buildUp?.name ?? zone.buildUpId,
    finish: worked.finish,
    plan_mm2: area.plan_mm2,
    true_mm2: area.net_mm2,
    ground_mm: buildUp ? groundThickness(buildUp, facts, card.buildUps).thickness_mm : 0,
    hours: worked.handsOn.hours,
    steps: worked.handsOn.steps.map(stepFigures),
    layers: buildUp ? sectionStrip(buildUp, facts, metal) : [],
    leaf: zoneLeafFigures(worked, card),
    recutting: recut ? { hours: recut.hours, reasons: recut.reasons } : null,
    reasons: area.reasons,
  };
}

function zonesFigures({ zones, carving }: EstimateWork, card: RateCard): ZoneFigures[] {
  const recut = new Map(carving.recut.map((zone) => [zone.zoneId, zone]));
  return zones.map((worked) => zoneFigures(worked, recut.get(worked.zone.id), card));
}

type MemberOfUse = ReadonlyMap<string, string>;

/** The member that carries each ornament. */
const memberOfUse = ({ members }: EstimateWork): MemberOfUse =>
  new Map(members.flatMap(({ member }) => member.ornaments.map((own) => [own.id, member.id] as const)));

function membersFigures(work: EstimateWork, memberOf: MemberOfUse, card: RateCard): MemberFigures[] {
  const zones = groupedBy(work.zones, (zone) => zone.memberId);
  const uses = groupedBy(work.carving.uses, ({ useId }) => memberOf.get(useId) ?? '');
  return work.members.map((measured) => {
    const { id } = measured.member;
    return memberFigures(measured, { zones: zones.get(id) ?? [], uses: uses.get(id) ?? [] }, card);
  });
}

function useFigures({ carving: { uses } }: EstimateWork, memberOf: MemberOfUse, card: RateCard): UseFigures[] {
  const names = new Map([...card.carving.items, ...card.carving.ornaments].map(({ id, name }) => [id, name]));
  return uses.map(({ useId, ornamentId, quantity, fit, factor, carving, reasons }) => {
    const memberId = memberOf.get(useId) ?? '';
    const ornament = names.get(ornamentId) ?? ornamentId;
    return { useId, quantity, fit, factor, carving, reasons, memberId, ornament };
  });
}

function carvingFigures({ carving }: EstimateWork, card: RateCard): CarvingFigures {
  const { rows, total, sharpening, patterns, reasons } = carving;
  const stages = card.carving.stages.map(({ id, name }) => ({ id, name }));
  return { rows, total, sharpening, patterns, stages, reasons };
}

const leafFigures = (work: EstimateWork, card: RateCard): LeafFigures[] =>
  work.leaf.map(({ productId, netLeaves, grossLeaves, booklets, coverage, mass_grams, reasons }) => ({
    ...{ productId, netLeaves, grossLeaves, booklets, coverage, mass_grams, reasons },
    ...{ grossLeaves_p10: grossLeaves.likely, grossLeaves_p90: grossLeaves.likely },
    name: nameOf(card.leaf.products, productId),
  }));

function gradeFigures(work: EstimateWork, card: RateCard): GradeFigures[] {
  return card.money.grades.flatMap(({ id, name }) => {
    const hours = sum(work.labour.filter((entry) => entry.gradeId === id).map((entry) => entry.hours));
    return hours > 0 ? [{ gradeId: id, name, hours }] : [];
  });
}

type TallyOfWork = Omit<Tally, 'workingDays' | 'weeks'>;

function tallyOf(work: EstimateWork, members: readonly MemberFigures[]): TallyOfWork {
  const booklets = sum(work.leaf.map((total) => total.booklets));
  return {
    members: sum(work.members.map(({ member }) => member.count)),
    true_mm2: sum(members.map((member) => member.true_mm2)),
    carving_hours: work.carving.total,
    handsOn_hours: tripleSum(work.zones.map((zone) => zone.handsOn.hours)),
    ...{ booklets, booklets_p10: booklets, booklets_p90: booklets },
  };
}

/** The figures of an estimate's work, without a word of money: areas mm², hours decimal, leaves not rounded, booklets whole; without trials no range of leaf. */
export function workFigures(work: EstimateWork, settings: EstimateSettings, card: RateCard): WorkFigures {
  const { dry, findings } = dryFigures(work, settings, card);
  const memberOf = memberOfUse(work);
  const members = membersFigures(work, memberOf, card);
  return {
    calculatorVersion,
    tally: { ...tallyOf(work, members), workingDays: dry.elapsed_workingDays, weeks: dry.elapsed_weeks },
    members,
    zones: zonesFigures(work, card),
    uses: useFigures(work, memberOf, card),
    carving: carvingFigures(work, card),
    grades: gradeFigures(work, card),
    leaf: leafFigures(work, card),
    materials: work.materials.map(({ materialId, name, unit, need, bought, reasons: because }) => ({
      ...{ materialId, name, unit, need, bought, reasons: because },
    })),
    batches: recipeBatches(work.zones, card.buildUps),
    dry,
    findings: [...work.findings, ...findings],
  };
}
