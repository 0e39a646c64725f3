import { bandSurface } from '#shared/measure/band-surface';
import { flatSurface } from '#shared/measure/flat-surface';
import { legSurface } from '#shared/measure/leg-surface';
import { because } from '#shared/measure/made-surface';
import { measuredSurface } from '#shared/measure/measured-surface';
import { mouldingSurface } from '#shared/measure/moulding-surface';
import { refuseImpossible } from '#shared/measure/refuse-impossible';
import type { Shape } from '#shared/measure/shape';
import { solidSurface } from '#shared/measure/solid-surface';
import { cabrioleSurface, unevenStationsSurface } from '#shared/measure/stations-surface';
import type { Surface } from '#shared/measure/surface';
import { turnedSurface } from '#shared/measure/turned-surface';
import { helicoidSurface, twistedSurface } from '#shared/measure/twisted-surface';

function ofKind(shape: Shape): Surface {
  switch (shape.kind) {
    case 'moulding':
      return mouldingSurface(shape);
    case 'turned':
      return turnedSurface(shape);
    case 'straight-leg':
      return legSurface(shape);
    case 'cabriole':
      return cabrioleSurface(shape);
    case 'stations':
      return unevenStationsSurface(shape);
    case 'twisted':
      return twistedSurface(shape);
    case 'helicoid':
      return helicoidSurface(shape);
    case 'band':
      return bandSurface(shape);
    case 'measured':
      return measuredSurface(shape);
    case 'sphere':
    case 'ball-foot':
    case 'bun-foot':
    case 'torus':
    case 'cone':
    case 'box':
    case 'boss':
      return solidSurface(shape);
    default:
      return flatSurface(shape);
  }
}

/**
 * The developed surface of one member of a shape, in mm and mm², good to 1e-6 of the value, before openings, count, share and
 * relief; throws a RangeError for a shape its schema refuses (negative lengths, crossing corners, even stations …).
 */
export function surfaceOf(shape: Shape): Surface {
  refuseImpossible(shape);
  const surface = ofKind(shape);
  return { ...surface, reasons: [...surface.reasons, because('measure-developed', [surface.area_mm2, 'mm2'])] };
}
