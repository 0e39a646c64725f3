import { countDown } from '#shared/money/settled';

/** Whole strips of a width (mm, above zero) one leaf of a side (mm) yields, never fewer than one. */
export const stripsFromLeaf = (side_mm: number, strip_mm: number): number => Math.max(1, countDown(side_mm / strip_mm));
