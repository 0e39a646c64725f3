/**
 * Flutes or reeds (arcs of a circle) or V grooves cut along a surface: each so wide and deep, with so much plain surface between
 * two of them, over a share of the surface.
 */
export interface Fluting {
  readonly cut: 'flutes' | 'reeds' | 'v-grooves';
  readonly width_mm: number;
  readonly depth_mm: number;
  readonly between_mm: number;
  readonly share_percent: number;
}

/** What any shape with a girth may carry. */
export interface Fluted {
  readonly fluting?: Fluting | undefined;
}
