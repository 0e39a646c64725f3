import type { LeafFinish } from '#shared/leaf/leaf-card';

/** What leaf has to know of the build-up it is laid in. */
export interface LaidGround {
  readonly system: 'water' | 'oil' | 'water-borne-size';
  readonly finish: LeafFinish;
  readonly isSealed: boolean;
}
