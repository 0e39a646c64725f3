import { because, madeSurface } from '#shared/measure/made-surface';
import type { MeasuredShape } from '#shared/measure/measured-shape';
import type { Surface } from '#shared/measure/surface';

/** A surface as somebody gave it, with its uncertainty, in mm²; laid in patches where the true surface was taken. */
export const measuredSurface = ({ area_mm2, uncertainty_mm2, note, isTrueSurface }: MeasuredShape): Surface =>
  madeSurface({
    area_mm2,
    uncertainty_mm2,
    isTrueSurface,
    laying: isTrueSurface ? 'patches' : 'sheets',
    finish: isTrueSurface ? 'carved' : 'plain',
    reasons: [
      because('measure-given', [area_mm2, 'mm2'], { note }),
      because('measure-uncertainty', [uncertainty_mm2, 'mm2']),
    ],
  });
