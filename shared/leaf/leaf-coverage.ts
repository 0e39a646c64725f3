import { leafArea } from '#shared/leaf/leaf-area';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import { squareMillimetresPerSquareFoot } from '#shared/units/exact-factors';

/** How leaf stands to the surface it covers; all zero without a surface. */
export interface LeafCoverage {
  /** Area of the leaf drawn ÷ true surface, and what of it is lost or lapped, in percent. */
  readonly grossToNet: number;
  readonly loss_percent: number;
  readonly leavesPerM2: number;
  readonly leavesPerFt2: number;
}

/** Compares so many leaves with the true surface (mm²) they cover. */
export function leafCoverage(product: LeafProduct, leaves: number, trueArea_mm2: number): LeafCoverage {
  if (trueArea_mm2 <= 0) return { grossToNet: 0, loss_percent: 0, leavesPerM2: 0, leavesPerFt2: 0 };
  const grossToNet = (leaves * leafArea(product)) / trueArea_mm2;
  return {
    grossToNet,
    loss_percent: grossToNet > 0 ? 100 * (1 - 1 / grossToNet) : 0,
    leavesPerM2: (leaves * 1e6) / trueArea_mm2,
    leavesPerFt2: (leaves * squareMillimetresPerSquareFoot) / trueArea_mm2,
  };
}
