import type { Surface } from '#shared/measure/surface';
import type { ZoneTake } from '#shared/measure/zone-take';

/** What a zone takes of a surface: a share 0…1 of its area, and the girth in mm of the parts it takes by themselves. */
export interface ZoneShare {
  readonly share: number;
  readonly girth_mm?: number;
}

/** The share of a surface's area a zone takes; parts of the girth by their own areas, unknown ones counting nothing. */
export function zoneShare(take: ZoneTake, surface: Surface): ZoneShare {
  if (take.way === 'share') return { share: take.share_percent / 100 };
  const parts = surface.parts.filter(({ key }) => take.parts.includes(key));
  const area_mm2 = parts.reduce((sum, part) => sum + part.area_mm2, 0);
  return {
    share: surface.area_mm2 === 0 ? 0 : area_mm2 / surface.area_mm2,
    girth_mm: parts.reduce((sum, part) => sum + part.girth_mm, 0),
  };
}
