import type { ZoneLeafFigures } from '#shared/estimates/figures';
import { laidField } from '#shared/leaf/laid-field';
import type { LayPlanBand } from '#shared/leaf/lay-plan';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';
import type { ZoneTake } from '#shared/measure/zone-take';

/** A zone as it is laid: its member's shape, what it takes of it, and how its leaf was worked. */
export interface LaidZone {
  readonly shape: Shape;
  readonly take: ZoneTake;
  readonly leaf: ZoneLeafFigures;
}

/**
 * The bands a gilder lays one member's zone in, in mm: along the run in strips, or field by field in whole leaves. A share of a member is
 * shown on the whole of it; patches, and surfaces counted by area, have no plan.
 */
export function zoneLayBands({ shape, take, leaf }: LaidZone): LayPlanBand[] {
  const field = laidField({ surface: surfaceOf(shape), partKeys: take.way === 'parts' ? take.parts : null });
  const { side_mm, lap_mm, strips } = leaf;
  if (leaf.way === 'lays' && field.moulding && strips !== null) {
    const { run_mm: length_mm, girth_mm: height_mm } = field.moulding;
    return [{ length_mm, height_mm, pieceLength_mm: side_mm, pieceHeight_mm: side_mm / strips, lap_mm }];
  }
  if (leaf.way !== 'sheets') return [];
  return field.courses.map(({ length_mm, height_mm }) => ({
    ...{ length_mm, height_mm, pieceLength_mm: side_mm, pieceHeight_mm: side_mm, lap_mm },
  }));
}
