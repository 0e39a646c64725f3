/** A table of few columns is no wider than its columns need: the eye has to find its way along a row. */
export const tableWidth_px = (columns: number): number => 160 + columns * 160;
