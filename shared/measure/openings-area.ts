import type { Opening } from '#shared/measure/opening';
import { surfaceOf } from '#shared/measure/surface-of';

/** Area of all openings of one member in mm²; throws a RangeError for an opening its schema refuses. */
export const openingsArea = (openings: readonly Opening[]): number =>
  openings.reduce((sum, { shape, count }) => sum + count * surfaceOf(shape).area_mm2, 0);
