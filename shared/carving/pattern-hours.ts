import type { CarvingCard } from '#shared/carving/carving-card';
import type { CarvingHoursRow, PatternHours } from '#shared/carving/carving-result';
import type { CarvedUse } from '#shared/carving/carving-work';
import { groupedBy } from '#shared/units/grouped-by';
import { mapTriple } from '#shared/units/triple';

// One drawing serves all ordinary uses of an ornament, at any size; each use marked for its own pattern needs one more.
const patternsOf = (uses: readonly CarvedUse[]): number => {
  const own = uses.filter(({ use }) => use.hasOwnPattern).length;
  return own + (own < uses.length ? 1 : 0);
};

/** Drawing and pattern of every repeated ornament that is used, in hours: once for each ornament, and once for each use that differs. */
export function patternHours(uses: readonly CarvedUse[], card: CarvingCard): PatternHours[] {
  const byOrnament = groupedBy(uses, ({ use }) => use.ornamentId);
  return card.ornaments.flatMap((ornament) => {
    const own = byOrnament.get(ornament.id);
    if (!own) return [];
    const patterns = patternsOf(own);
    return [
      { ornamentId: ornament.id, patterns, hours: mapTriple(ornament.patternHours, (hours) => hours * patterns) },
    ];
  });
}

/** Patterns as rows of hours, to the grade of the card that draws them. */
export const patternRows = (patterns: readonly PatternHours[], card: CarvingCard): CarvingHoursRow[] =>
  patterns.map(({ hours }) => ({ kind: 'pattern', stageId: '', gradeId: card.patternGradeId, hours }));
