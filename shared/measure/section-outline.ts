import type { TwistedSection } from '#shared/measure/leg-shape';

/** The outline of a section in polar form: radius and its slope by angle, in mm and mm per radian. */
export interface SectionOutline {
  readonly radiusAt: (angle: number) => number;
  readonly slopeAt: (angle: number) => number;
  /** The angle of one smooth piece from 0, and how many of those (each the same or its mirror image) make the whole turn. */
  readonly piece_radians: number;
  readonly pieces: number;
}

/**
 * The outline of a twisted member's section. Lobed: the mean radius, waving by half the depth either way, so many times round.
 * Square: half the width across the flats over the cosine, from the middle of a face to a corner.
 */
export function sectionOutline(section: TwistedSection): SectionOutline {
  if (section.outline === 'square') {
    const half = section.across_mm / 2;
    return {
      radiusAt: (angle) => half / Math.cos(angle),
      slopeAt: (angle) => (half * Math.tan(angle)) / Math.cos(angle),
      piece_radians: Math.PI / 4,
      pieces: 8,
    };
  }
  const { radius_mm, depth_mm, lobes } = section;
  return {
    radiusAt: (angle) => radius_mm + (depth_mm / 2) * Math.cos(lobes * angle),
    slopeAt: (angle) => -lobes * (depth_mm / 2) * Math.sin(lobes * angle),
    piece_radians: Math.PI / lobes,
    pieces: 2 * lobes,
  };
}
