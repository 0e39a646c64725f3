import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvingHoursRow, RecutHours, UseHours } from '#shared/carving/carving-result';
import type { RecutZone } from '#shared/carving/carving-work';
import { ornamentCarving } from '#shared/carving/hours-of-kinds';
import { groupedBy } from '#shared/units/grouped-by';
import { mapTriple, type Triple } from '#shared/units/triple';
import type { Reason } from '#shared/words/reason';

const recutRow = (hours: Triple, card: CarvingCard): CarvingHoursRow => ({
  kind: 'recutting',
  stageId: '',
  gradeId: card.recutting.gradeId,
  hours,
});

const byShare = (zone: RecutZone, carved: Triple, card: CarvingCard): [Triple, Reason] => {
  const { share_percent } = card.recutting[zone.manner];
  const hours = mapTriple(carved, (figure) => (figure * share_percent) / 100);
  const values = { share_percent, carving_hours: carved.likely, manner: zone.manner };
  const house = `carving.recutting.${zone.manner}.share_percent`;
  return [hours, { code: 'carving-recut-share', values, figure: hours.likely, unit: 'hours', house }];
};

const byArea = (zone: RecutZone, card: CarvingCard): [Triple, Reason] => {
  const { hours_per_m2 } = card.recutting[zone.manner];
  const figure = (hours_per_m2 * zone.planArea_mm2) / 1e6;
  const values = { area_mm2: zone.planArea_mm2, each_hours: hours_per_m2, manner: zone.manner };
  const house = `carving.recutting.${zone.manner}.hours_per_m2`;
  return [
    { low: figure, likely: figure, high: figure },
    { code: 'carving-recut-area', values, figure, unit: 'hours', house },
  ];
};

/**
 * Recutting in gesso of each zone: a share of the carving hours of its ornaments, or hours per m² of plan area where nothing is carved
 * on it (a restored or bought-in base).
 */
export function recutHours(zones: readonly RecutZone[], uses: readonly UseHours[], card: CarvingCard): RecutHours[] {
  const byZone = groupedBy(uses, (use) => use.zoneId);
  return zones.map((zone) => {
    const carved = ornamentCarving((byZone.get(zone.zoneId) ?? []).flatMap((use) => use.rows));
    const [hours, reason] = carved.likely > 0 ? byShare(zone, carved, card) : byArea(zone, card);
    return { zoneId: zone.zoneId, hours, reasons: [reason] };
  });
}

/** Recutting as rows of hours for the whole estimate. */
export const recutRows = (recut: readonly RecutHours[], card: CarvingCard): CarvingHoursRow[] =>
  recut.map(({ hours }) => recutRow(hours, card));

/** The zones recut, to be found by their id. */
export type RecutZones = ReadonlyMap<string | null, readonly RecutZone[]>;
/** Zones recut in gesso by their id, for looking up; areas in mm² as they were given. */
export const recutZonesById = (zones: readonly RecutZone[]): RecutZones => groupedBy(zones, (zone) => zone.zoneId);

/** Recutting one use brings with it, where its zone is recut; none for zones recut by area. */
export function recutRowsOfUse(use: UseHours, zones: RecutZones, card: CarvingCard): CarvingHoursRow[] {
  const own = zones.get(use.zoneId);
  if (!own) return [];
  const carved = ornamentCarving(use.rows);
  return own.map((zone) =>
    recutRow(
      mapTriple(carved, (figure) => (figure * card.recutting[zone.manner].share_percent) / 100),
      card,
    ),
  );
}
