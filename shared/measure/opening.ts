import type { FlatShape } from '#shared/measure/flat-shape';

/** An opening whose area is simply given. */
export interface GivenFace {
  readonly kind: 'given';
  readonly area_mm2: number;
}

/** What is cut out of one member, so many times: a flat face or a given area. Fluting of a face does not matter here. */
export interface Opening {
  readonly id: string;
  readonly face: FlatShape | GivenFace;
  readonly count: number;
}
