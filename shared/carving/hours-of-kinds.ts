import type { CarvingHoursRow, CarvingWorkKind, GradeHours } from '#shared/carving/carving-result';
import { groupedBy } from '#shared/units/grouped-by';
import { mapTriple, type Triple } from '#shared/units/triple';
import { tripleSum } from '#shared/units/triple-sum';

const together = <Row extends { readonly hours: Triple }>(rows: readonly Row[], keyOf: (row: Row) => string): Row[] => {
  const groups = groupedBy(rows, keyOf);
  return [...groups.values()].map((group) => ({ ...group[0], hours: tripleSum(group.map((row) => row.hours)) }));
};

/** Rows of the same kind, stage and grade added up, in the order they first appear; hours. */
export const rowsTogether = (rows: readonly CarvingHoursRow[]): CarvingHoursRow[] =>
  together(rows, (row) => `${row.kind} ${row.stageId} ${row.gradeId}`);

/** Hours of each grade over the given rows. */
export const gradesTogether = (rows: readonly GradeHours[]): GradeHours[] =>
  together(rows, (row) => row.gradeId).map(({ gradeId, hours }) => ({ gradeId, hours }));

/** Likely hours of each grade over the given rows. */
export function likelyByGrade(rows: readonly GradeHours[]): Map<string, number> {
  const grades = new Map<string, number>();
  for (const { gradeId, hours } of rows) grades.set(gradeId, (grades.get(gradeId) ?? 0) + hours.likely);
  return grades;
}

/** Hours of the rows of the given kinds. */
export const hoursOfKinds = (rows: readonly CarvingHoursRow[], kinds: readonly CarvingWorkKind[]): Triple =>
  tripleSum(rows.filter((row) => kinds.includes(row.kind)).map((row) => row.hours));

// Tools are sharpened for cutting wood, not for drawing and not for recutting gesso.
const cutting: readonly CarvingWorkKind[] = ['stage', 'undercutting', 'shaping', 'free'];

/** Sharpening of the given carving rows, to the grades that do the carving. */
export const sharpeningRows = (rows: readonly CarvingHoursRow[], sharpening_percent: number): CarvingHoursRow[] =>
  rows
    .filter((row) => cutting.includes(row.kind))
    .map(({ gradeId, hours }) => ({
      kind: 'sharpening',
      stageId: '',
      gradeId,
      hours: mapTriple(hours, (figure) => (figure * sharpening_percent) / 100),
    }));

/** Hours of ornament that recutting in gesso is a share of: repeated and free carving, not the shaping of the blank. */
export const ornamentCarving = (rows: readonly CarvingHoursRow[]): Triple =>
  hoursOfKinds(rows, ['stage', 'undercutting', 'free']);
