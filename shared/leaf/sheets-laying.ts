import { hasRoomForLaps, type LeafStep, piecesAlong } from '#shared/leaf/leaf-step';
import { stripsFromLeaf } from '#shared/leaf/strips-from-leaf';
import type { Course } from '#shared/measure/surface';
import { countDown } from '#shared/money/settled';

/** One field laid in whole leaves by courses, in the direction that takes least. */
export interface SheetField {
  readonly length_mm: number;
  readonly height_mm: number;
  /** Courses run along the length, or along the height. */
  readonly direction: 'along' | 'across';
  readonly leavesAlong: number;
  readonly fullCourses: number;
  /** Width of the last strip, zero where full courses fill the field; how many strips a leaf yields. */
  readonly strip_mm: number;
  readonly stripsPerLeaf: number;
  readonly leaves: number;
  readonly pieces: number;
}

/** Leaf laid in sheets on one member, leaves not rounded. */
export interface SheetsLaying {
  readonly way: 'sheets';
  readonly step_mm: number;
  readonly fields: readonly SheetField[];
  /** Surface no field covers, counted by area. */
  readonly rest_mm2: number;
  readonly leaves: number;
  readonly pieces: number;
}

interface Stack {
  readonly full: number;
  readonly strip_mm: number;
}

// Full courses side by side and the width of the strip that closes the field; R + o wide, or the whole height when no course fits.
function stack(height_mm: number, isClosed: boolean, { side_mm, lap_mm }: LeafStep): Stack {
  const step_mm = side_mm - lap_mm;
  const usable_mm = height_mm - (isClosed ? 0 : lap_mm);
  const full = countDown(usable_mm / step_mm);
  const all = piecesAlong(height_mm, isClosed, { side_mm, lap_mm });
  if (all === full) return { full, strip_mm: 0 };
  if (full === 0 && !isClosed) return { full, strip_mm: height_mm };
  return { full, strip_mm: usable_mm - full * step_mm + lap_mm };
}

function inDirection(course: Course, direction: SheetField['direction'], step: LeafStep): SheetField {
  const isAlong = direction === 'along';
  const [length_mm, height_mm] = isAlong ? [course.length_mm, course.height_mm] : [course.height_mm, course.length_mm];
  const leavesAlong = piecesAlong(length_mm, isAlong && course.closed, step);
  const { full, strip_mm } = stack(height_mm, !isAlong && course.closed, step);
  const stripsPerLeaf = strip_mm > 0 ? stripsFromLeaf(step.side_mm, strip_mm) : 0;
  const strips = strip_mm > 0 ? leavesAlong : 0;
  return {
    length_mm: course.length_mm,
    height_mm: course.height_mm,
    direction,
    leavesAlong,
    fullCourses: full,
    strip_mm,
    stripsPerLeaf,
    leaves: full * leavesAlong + (strips > 0 ? strips / stripsPerLeaf : 0),
    pieces: full * leavesAlong + strips,
  };
}

function sheetField(course: Course, step: LeafStep): SheetField {
  const along = inDirection(course, 'along', step);
  if (course.length_mm <= 0 || course.height_mm <= 0) return { ...along, leaves: 0, pieces: 0 };
  const across = inDirection(course, 'across', step);
  return across.leaves < along.leaves ? across : along;
}

/**
 * Leaves laid whole: fields (mm) by courses, n = floor((H−o)/(s−o)) full ones and a last strip, in the direction that takes least; any
 * other surface (mm²) by area ÷ (s−o)². Not rounded. Throws a RangeError unless s > 2o. House rule of laying.
 */
export function sheetsLaying(
  field: { readonly area_mm2: number; readonly courses: readonly Course[] },
  step: LeafStep,
): SheetsLaying {
  if (!hasRoomForLaps(step, 1)) throw new RangeError('a leaf must be wider than two laps');
  const step_mm = step.side_mm - step.lap_mm;
  const fields = field.courses.map((course) => sheetField(course, step));
  const covered_mm2 = field.courses.reduce((sum, course) => sum + course.length_mm * course.height_mm, 0);
  const rest = field.area_mm2 - covered_mm2;
  const rest_mm2 = rest > field.area_mm2 * 1e-9 ? rest : 0;
  const byArea = rest_mm2 / step_mm ** 2;
  const leaves = fields.reduce((sum, next) => sum + next.leaves, byArea);
  return {
    way: 'sheets',
    step_mm,
    fields,
    rest_mm2,
    leaves,
    pieces: fields.reduce((sum, next) => sum + next.pieces, byArea),
  };
}
