import type { Fluting } from '#shared/measure/fluting';
import { flutingFactor } from '#shared/measure/fluting-factor';
import { because } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';

/** A surface with its girth multiplied by what is cut along it; it is moulded then, and laid in lays instead of courses. Areas in mm². */
export function flutedSurface(plain: Surface, fluting: Fluting | undefined): Surface {
  const factor = flutingFactor(fluting);
  if (factor === 1) return plain;
  return {
    ...plain,
    area_mm2: plain.area_mm2 * factor,
    ...(plain.girth_mm === undefined ? {} : { girth_mm: plain.girth_mm * factor }),
    ...(plain.uncertainty_mm2 === undefined ? {} : { uncertainty_mm2: plain.uncertainty_mm2 * factor }),
    parts: plain.parts.map((part) => ({
      ...part,
      girth_mm: part.girth_mm * factor,
      area_mm2: part.area_mm2 * factor,
    })),
    courses: [],
    laying: plain.laying === 'sheets' ? 'lays' : plain.laying,
    finish: 'moulded',
    reasons: [...plain.reasons, because('measure-fluting', [factor, 'factor'])],
  };
}
