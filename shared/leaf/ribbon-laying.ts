import { hasRoomForLaps, type LeafStep, piecesAlong } from '#shared/leaf/leaf-step';
import type { Course } from '#shared/measure/surface';

/** Ribbon laid on one member; a leaf is one roll, rolls are not rounded. */
export interface RibbonLaying {
  readonly way: 'ribbon';
  /** Ribbon unrolled. */
  readonly length_mm: number;
  readonly leaves: number;
  /** Lengths laid. */
  readonly pieces: number;
}

interface Lengths {
  readonly length_mm: number;
  readonly pieces: number;
}

const lengths = (pieces: number, each_mm: number): Lengths => ({ length_mm: pieces * each_mm, pieces });

function onField(course: Course, step: LeafStep): Lengths {
  if (course.length_mm <= 0 || course.height_mm <= 0) return lengths(0, 0);
  const joint_mm = course.closed ? step.lap_mm : 0;
  const along = lengths(piecesAlong(course.height_mm, false, step), course.length_mm + joint_mm);
  const across = lengths(piecesAlong(course.length_mm, course.closed, step), course.height_mm);
  return across.length_mm < along.length_mm ? across : along;
}

/**
 * Ribbon of a width (the step's side, mm) and a roll's length (mm) laid on fields side by side in the direction that takes least, any
 * other surface (mm²) by its area; in rolls. Throws a RangeError unless the ribbon is wider than two laps. House rule of laying.
 */
export function ribbonLaying(
  field: { readonly area_mm2: number; readonly courses: readonly Course[] },
  step: LeafStep,
  roll_mm: number,
): RibbonLaying {
  if (!hasRoomForLaps(step, 1)) throw new RangeError('a ribbon must be wider than two laps');
  const covered_mm2 = field.courses.reduce((sum, course) => sum + course.length_mm * course.height_mm, 0);
  const rest_mm2 = Math.max(0, field.area_mm2 - covered_mm2);
  const laid = field.courses.map((course) => onField(course, step));
  const length_mm = laid.reduce((sum, next) => sum + next.length_mm, rest_mm2 / (step.side_mm - step.lap_mm));
  const pieces = laid.reduce((sum, next) => sum + next.pieces, rest_mm2 > 0 ? length_mm / roll_mm : 0);
  return { way: 'ribbon', length_mm, leaves: length_mm / roll_mm, pieces };
}
