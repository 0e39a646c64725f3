import type { RecuttingManner } from '#shared/carving/carving-card';
import type { OrnamentUse } from '#shared/carving/ornament-use';

/** One use with what its member says: how many identical ones there are, and of which timber. */
export interface CarvedUse {
  readonly use: OrnamentUse;
  readonly members: number;
  readonly timberId: string;
}

/** A zone recut in gesso, with its plan area over all identical members. */
export interface RecutZone {
  readonly zoneId: string;
  readonly manner: RecuttingManner;
  readonly planArea_mm2: number;
}

/** All the carving of an estimate, alternatives already chosen: learning is counted over the whole of it. */
export interface CarvingWork {
  readonly uses: readonly CarvedUse[];
  readonly recut: readonly RecutZone[];
}
