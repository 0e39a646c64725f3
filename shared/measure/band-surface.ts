import type { BandShape } from '#shared/measure/band-shape';
import { bandLength, bandSides, bandStretches } from '#shared/measure/band-stretches';
import { flutedSurface } from '#shared/measure/fluted-surface';
import { because, girthByRun } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';

/** The surface of an unrolled rim in mm and mm², laid by courses along its whole length; stretches are told, not cut out of it. */
export function bandSurface(shape: BandShape): Surface {
  const length_mm = bandLength(shape.length);
  const { whole, stretch_mm, rest_mm } = bandStretches(shape);
  const cut = shape.stretch_mm ? [because('measure-stretches', [whole, 'number'], { stretch_mm, rest_mm })] : [];
  const band = girthByRun({
    girth_mm: shape.height_mm,
    run_mm: length_mm,
    closedRun: shape.closed,
    sides_mm: bandSides(shape.length),
    courses: [{ length_mm, height_mm: shape.height_mm, closed: shape.closed }],
    reasons: cut,
  });
  return flutedSurface(band, shape.fluting);
}
