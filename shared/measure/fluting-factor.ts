import { arcLength } from '#shared/geometry/bowed-arc';
import type { Fluting } from '#shared/measure/fluting';

// Developed width of one cut: the arc over its chord, or the two sides of a V.
function cutGirth({ cut, width_mm, depth_mm }: Fluting): number {
  if (cut === 'v-grooves') return 2 * Math.hypot(width_mm / 2, depth_mm);
  return arcLength({ from: { x: 0, y: 0 }, to: { x: width_mm, y: 0 }, bow: depth_mm });
}

/**
 * By how much cuts of this kind multiply the girth they are cut across, 1 without a cut: developed width of a cut and the plain
 * between, over their plain width, on their share of the surface (own geometry; half-round reeds side by side give π/2).
 */
export function flutingFactor(fluting: Fluting | undefined): number {
  const pitch_mm = fluting ? fluting.width_mm + fluting.between_mm : 0;
  if (!fluting || pitch_mm === 0) return 1;
  const worked = (cutGirth(fluting) + fluting.between_mm) / pitch_mm;
  return 1 + (fluting.share_percent / 100) * (worked - 1);
}
