/** An area somebody gives, with a note how they know, and how far off it may be either way. */
export interface MeasuredShape {
  readonly kind: 'measured';
  readonly area_mm2: number;
  readonly uncertainty_mm2: number;
  readonly note: string;
  /** Taken over the carved surface itself (by strips, foil or a scan), not on an enclosing plain form. */
  readonly isTrueSurface: boolean;
}
