import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvingHoursRow, CarvingResult, OrnamentHours, UseHours } from '#shared/carving/carving-result';
import type { CarvingWork } from '#shared/carving/carving-work';
import { gradesTogether, hoursOfKinds, rowsTogether, sharpeningRows } from '#shared/carving/hours-of-kinds';
import { hoursOfUses, unknownOrnaments } from '#shared/carving/hours-of-uses';
import { patternHours, patternRows } from '#shared/carving/pattern-hours';
import { recutHours, recutRows, recutRowsOfUse, recutZonesById } from '#shared/carving/recut-hours';
import { groupedBy } from '#shared/units/grouped-by';
import { tripleSum } from '#shared/units/triple-sum';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

function ornamentTotals(uses: readonly UseHours[], work: CarvingWork, card: CarvingCard): OrnamentHours[] {
  const recut = recutZonesById(work.recut);
  return [...groupedBy(uses, (use) => use.ornamentId)].map(([ornamentId, own]) => {
    const rows = own.flatMap((use) => [
      ...use.rows,
      ...sharpeningRows(use.rows, card.sharpening_percent),
      ...recutRowsOfUse(use, recut, card),
    ]);
    return { ornamentId, carving: tripleSum(own.map((use) => use.carving)), grades: gradesTogether(rows) };
  });
}

function totalReasons(rows: readonly CarvingHoursRow[], card: CarvingCard): Reason[] {
  const likely = (...kinds: CarvingHoursRow['kind'][]) => hoursOfKinds(rows, kinds).likely;
  const total = tripleSum(rows.map((row) => row.hours));
  const percent = card.sharpening_percent;
  const reasons: Reason[] = [
    { code: 'carving-total-ornament', values: {}, figure: likely('stage', 'undercutting'), unit: 'hours' },
    { code: 'carving-total-items', values: {}, figure: likely('shaping', 'free'), unit: 'hours' },
    { code: 'carving-total-once', values: {}, figure: likely('pattern', 'once'), unit: 'hours' },
    {
      code: 'carving-total-sharpening',
      values: { sharpening_percent: percent },
      figure: likely('sharpening'),
      unit: 'hours',
      house: 'carving.sharpening_percent',
    },
    {
      code: 'carving-total-recutting',
      values: {},
      figure: likely('recutting'),
      unit: 'hours',
      house: 'carving.recutting',
    },
  ];
  const values = { low_hours: total.low, high_hours: total.high };
  return [
    ...reasons.filter((reason) => reason.figure !== 0),
    { code: 'carving-hours', values, figure: total.likely, unit: 'hours' },
  ];
}

// Wood dust, soft or hard, is in Group 1 of the IARC monographs (volume 100C, 2012).
const dust = (rows: readonly CarvingHoursRow[]): Finding[] =>
  hoursOfKinds(rows, ['stage', 'undercutting', 'shaping', 'free']).high > 0
    ? [{ kind: 'caution', code: 'carving-wood-dust', values: {} }]
    : [];

/**
 * Carving hours of all uses of an estimate together, by stage and grade, low, likely and high: first-unit hours × size × timber ×
 * relief ÷ reference relief × undercut × plan × learning; patterns once for each ornament; sharpening added once; recutting for each
 * zone. What the card does not know is a finding. House rules of the workshop throughout.
 */
export function carvingHours(work: CarvingWork, card: CarvingCard): CarvingResult {
  const uses = hoursOfUses(work.uses, card);
  const patterns = patternHours(work.uses, card);
  const recut = recutHours(work.recut, uses, card);
  const carved = uses.flatMap((use) => use.rows);
  const sharpened = sharpeningRows(carved, card.sharpening_percent);
  const rows = rowsTogether([...patternRows(patterns, card), ...carved, ...sharpened, ...recutRows(recut, card)]);
  return {
    uses,
    patterns,
    recut,
    ornaments: ornamentTotals(uses, work, card),
    rows,
    grades: gradesTogether(rows),
    sharpening: tripleSum(sharpened.map((row) => row.hours)),
    total: tripleSum(rows.map((row) => row.hours)),
    reasons: totalReasons(rows, card),
    findings: [...unknownOrnaments(work.uses, card), ...uses.flatMap((use) => use.findings), ...dust(rows)],
  };
}
