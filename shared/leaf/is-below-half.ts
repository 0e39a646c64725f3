import { settled } from '#shared/money/settled';

/** Whether a size (mm) is less than half a leaf's side, so that two and more are cut from it. */
export const isBelowHalf = (size_mm: number, side_mm: number): boolean => size_mm > 0 && settled(2 * size_mm) < side_mm;
