import type { Fluted } from '#shared/measure/fluting';

export type BandPart =
  | { readonly part: 'straight'; readonly length_mm: number }
  | { readonly part: 'curve'; readonly radius_mm: number; readonly angle_degrees: number };

/** The length of a rim as taken with a tape, or put together from straight and curved parts. */
export type BandLength =
  { readonly by: 'tape'; readonly length_mm: number } | { readonly by: 'parts'; readonly parts: readonly BandPart[] };

/** An unrolled rim; `stretch_mm` is the length it is cut into, when it is. */
export interface BandShape extends Fluted {
  readonly kind: 'band';
  readonly length: BandLength;
  readonly height_mm: number;
  readonly closed: boolean;
  readonly stretch_mm?: number | undefined;
}
