import type { Surface } from '#shared/measure/surface';
import type { FigureUnit, Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** One step of a surface's explanation: a code, what came out, in which unit, with what. */
export const because = (
  code: WordCode,
  [figure, unit]: readonly [number, FigureUnit],
  values: WordValues = {},
): Reason => ({ code, values, figure, unit });

/** A surface from what is particular to its shape; all else is as on a plain flat face. Areas in mm². */
export const madeSurface = (facts: Pick<Surface, 'area_mm2'> & Partial<Surface>): Surface => ({
  closedRun: false,
  sides_mm: [],
  parts: [],
  courses: [],
  laying: 'sheets',
  finish: 'plain',
  isTrueSurface: false,
  reasons: [],
  ...facts,
});

/** A surface with no girth and run, by the steps it is worked in; mm². */
export const steppedSurface = (area_mm2: number, reasons: readonly Reason[], laying: Surface['laying'] = 'sheets') =>
  madeSurface({ area_mm2, laying, reasons });

/** A surface that is a girth times a run, in mm and mm². */
export const girthByRun = (facts: Partial<Surface> & { readonly girth_mm: number; readonly run_mm: number }): Surface =>
  madeSurface({
    area_mm2: facts.girth_mm * facts.run_mm,
    sides_mm: [facts.run_mm],
    ...facts,
    reasons: [
      because('measure-girth', [facts.girth_mm, 'mm']),
      because('measure-run', [facts.run_mm, 'mm']),
      ...(facts.reasons ?? []),
    ],
  });
