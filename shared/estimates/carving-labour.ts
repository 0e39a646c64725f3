import type { CarvingHoursRow, CarvingResult, UseHours } from '#shared/carving/carving-result';
import { likelyByGrade, ornamentCarving, sharpeningRows } from '#shared/carving/hours-of-kinds';
import { patternRows } from '#shared/carving/pattern-hours';
import { recutRowsOfUse, type RecutZones } from '#shared/carving/recut-hours';
import type { PriceLabour } from '#shared/estimates/price/price-input';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { groupedBy } from '#shared/units/grouped-by';

/** Which member a use or a zone belongs to. */
export type MemberOf = (id: string) => string | null;

const labourOf = (rows: readonly CarvingHoursRow[], memberId: string | null): PriceLabour[] =>
  [...likelyByGrade(rows)].map(([gradeId, hours]) => ({ memberId, kind: 'carving', gradeId, hours }));

interface CarvedBy {
  readonly result: CarvingResult;
  readonly recut: RecutZones;
  readonly card: RateCard;
  readonly memberOf: MemberOf;
}

function useLabour(use: UseHours, { recut, card, memberOf }: CarvedBy): PriceLabour[] {
  const sharpened = sharpeningRows(use.rows, card.carving.sharpening_percent);
  const recutting = recutRowsOfUse(use, recut, card.carving);
  return labourOf([...use.rows, ...sharpened, ...recutting], memberOf(use.useId));
}

/** Zones recut by area, since nothing is carved on them in this estimate: a blank that is shaped there is not yet ornament. */
function recutByArea({ result, card, memberOf }: CarvedBy): PriceLabour[] {
  const carved = new Set(result.uses.filter((use) => ornamentCarving(use.rows).likely > 0).map((use) => use.zoneId));
  const bare = result.recut.filter((zone) => !carved.has(zone.zoneId));
  return bare.map((zone) => ({
    memberId: memberOf(zone.zoneId),
    kind: 'carving',
    gradeId: card.carving.recutting.gradeId,
    hours: zone.hours.likely,
  }));
}

/** Drawing and pattern are charged where the ornament is used first. */
function patternLabour({ result, card, memberOf }: CarvedBy): PriceLabour[] {
  const byOrnament = groupedBy(result.uses, (use) => use.ornamentId);
  return result.patterns.flatMap((pattern) => {
    const [first] = byOrnament.get(pattern.ornamentId) ?? [];
    return labourOf(patternRows([pattern], card.carving), first ? memberOf(first.useId) : null);
  });
}

/** Likely carving hours by member and grade; together they are exactly the result's own hours. */
export const carvingLabour = (carved: CarvedBy): PriceLabour[] => [
  ...patternLabour(carved),
  ...carved.result.uses.flatMap((use) => useLabour(use, carved)),
  ...recutByArea(carved),
];
