import { countDown } from '#shared/money/settled';
import type { BandLength, BandPart, BandShape } from '#shared/measure/band-shape';

const partLength = (part: BandPart): number =>
  part.part === 'straight' ? part.length_mm : (part.radius_mm * part.angle_degrees * Math.PI) / 180;

/** Lengths a band's run is put together from, in mm: the tape's one, or each straight and curved part's. */
export const bandSides = (length: BandLength): number[] =>
  length.by === 'tape' ? [length.length_mm] : length.parts.map(partLength);

/** Whole length of a band in mm. */
export const bandLength = (length: BandLength): number => bandSides(length).reduce((sum, side_mm) => sum + side_mm, 0);

/** So many whole stretches of a band, and what is left over, in mm (0 when they fit exactly or the band is not cut). */
export interface BandStretches {
  readonly whole: number;
  readonly stretch_mm: number;
  readonly rest_mm: number;
}

/** How a band is cut into stretches, in mm; an uncut band is one whole stretch. Common practice, no source. */
export function bandStretches({ length, stretch_mm }: BandShape): BandStretches {
  const length_mm = bandLength(length);
  if (!stretch_mm) return { whole: length_mm > 0 ? 1 : 0, stretch_mm: length_mm, rest_mm: 0 };
  const whole = countDown(length_mm / stretch_mm);
  return { whole, stretch_mm, rest_mm: Math.max(0, withoutNoise(length_mm - whole * stretch_mm)) };
}

// A rest under a thousandth of a millimetre is the rounding of a conversion, not a stretch.
const withoutNoise = (rest_mm: number) => (Math.abs(rest_mm) < 1e-3 ? 0 : rest_mm);
