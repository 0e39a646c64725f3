import type { Ends } from '#shared/measure/ends';
import { because } from '#shared/measure/made-surface';
import type { Surface } from '#shared/measure/surface';

/** A surface with the chosen ends added, by the area of either end in mm²; ends are laid by area, so the whole is too. */
export function surfaceWithEnds(sides: Surface, ends: Ends, [top_mm2, bottom_mm2]: readonly [number, number]): Surface {
  if (!ends.top && !ends.bottom) return sides;
  const ends_mm2 = (ends.top ? top_mm2 : 0) + (ends.bottom ? bottom_mm2 : 0);
  return {
    ...sides,
    area_mm2: sides.area_mm2 + ends_mm2,
    ends_mm2,
    laying: sides.laying === 'lays' ? 'sheets' : sides.laying,
    reasons: [...sides.reasons, because('measure-ends', [ends_mm2, 'mm2'])],
  };
}
