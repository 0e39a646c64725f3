import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvingHoursRow } from '#shared/carving/carving-result';
import { mapTriple, type Triple } from '#shared/units/triple';

/**
 * Divides hours of repeated carving into stages and grades; of undercut work the undercut share is a stage of its own and the rest is
 * divided. The rows add up to the hours.
 */
export function stageRows(hours: Triple, isUndercut: boolean, card: CarvingCard): CarvingHoursRow[] {
  const plain = mapTriple(hours, (figure) => (isUndercut ? figure / (1 + card.undercut_percent / 100) : figure));
  const stages = card.stages.map(({ id, share_hundredths, gradeId }): CarvingHoursRow => {
    return {
      kind: 'stage',
      stageId: id,
      gradeId,
      hours: mapTriple(plain, (figure) => (figure * share_hundredths) / 10_000),
    };
  });
  if (!isUndercut) return stages;
  const undercut = { low: hours.low - plain.low, likely: hours.likely - plain.likely, high: hours.high - plain.high };
  return [...stages, { kind: 'undercutting', stageId: '', gradeId: card.undercuttingGradeId, hours: undercut }];
}
