import type { CarvingHoursRow, CarvingWorkKind } from '#shared/carving/carving-result';
import { gradesTogether } from '#shared/carving/hours-of-kinds';
import type { Triple } from '#shared/units/triple';

/** Something of the rate card with its name. */
export interface Named {
  readonly id: string;
  readonly name: string;
}

/** Hours under a name, and who does them. */
export interface NamedHours {
  readonly id: string;
  readonly name: string;
  readonly grade: string;
  readonly hours: Triple;
}

const kindNames: Readonly<Record<Exclude<CarvingWorkKind, 'stage'>, string>> = {
  undercutting: $localize`Undercutting`,
  pattern: $localize`Drawing and patterns`,
  once: $localize`Done once`,
  shaping: $localize`Shaping`,
  free: $localize`Free carving`,
  sharpening: $localize`Sharpening`,
  recutting: $localize`Recutting in gesso`,
};

const nameOf = (named: readonly Named[], id: string): string => named.find((one) => one.id === id)?.name ?? id;

/** Rows of carving hours by stage and by what is no stage, with the names of stage and grade. */
export const stageHours = (
  rows: readonly CarvingHoursRow[],
  stages: readonly Named[],
  grades: readonly Named[],
): NamedHours[] =>
  rows
    .filter(({ hours }) => hours.high > 0)
    .map(({ kind, stageId, gradeId, hours }) => ({
      id: `${kind} ${stageId} ${gradeId}`,
      name: kind === 'stage' ? nameOf(stages, stageId) : kindNames[kind],
      grade: nameOf(grades, gradeId),
      hours,
    }));

/** The same hours by grade. */
export const gradeHours = (rows: readonly CarvingHoursRow[], grades: readonly Named[]): NamedHours[] =>
  gradesTogether(rows)
    .filter(({ hours }) => hours.high > 0)
    .map(({ gradeId, hours }) => ({ id: gradeId, name: nameOf(grades, gradeId), grade: '', hours }));
