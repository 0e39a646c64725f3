import { flutedSurface } from '#shared/measure/fluted-surface';
import type { StraightLegShape } from '#shared/measure/leg-shape';
import { because, girthByRun } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';
import { surfaceWithEnds } from '#shared/measure/surface-with-ends';

/** Girth of a section over its width across the flats (or diameter); its area is a quarter of that times the width squared. */
const girthPerWidth = { square: 4, octagonal: 8 * Math.tan(Math.PI / 8), round: Math.PI } as const;

/**
 * The surface of a straight or tapered leg in mm and mm²: mean girth × slant length, exact for all three sections (mensuration of
 * frustums, ICS Building Trades Pocketbook), and its chosen ends.
 */
export function legSurface(shape: StraightLegShape): Surface {
  const { section, length_mm, top_mm, foot_mm } = shape;
  const perWidth = girthPerWidth[section];
  const slant_mm = Math.hypot(length_mm, (top_mm - foot_mm) / 2);
  const sides = girthByRun({
    girth_mm: (perWidth * (top_mm + foot_mm)) / 2,
    run_mm: slant_mm,
    laying: 'lays',
    reasons: [because('measure-slant', [slant_mm - length_mm, 'mm'])],
  });
  const end_mm2 = (width_mm: number) => (perWidth / 4) * width_mm * width_mm;
  return surfaceWithEnds(flutedSurface(sides, shape.fluting), shape.ends, [end_mm2(top_mm), end_mm2(foot_mm)]);
}
