/** A stretch along a line, in pixels. */
export interface Stretch {
  readonly x: number;
  readonly width: number;
}
