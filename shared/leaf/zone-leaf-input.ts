import type { LaidGround } from '#shared/leaf/laid-ground';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { Relief, SurfaceFinish } from '#shared/measure/relief';
import type { Surface } from '#shared/measure/surface';

/** One zone to be laid with leaf: its member's surface, what it takes of it, and how. */
export interface ZoneLeafInput {
  readonly zoneId: string;
  readonly productId: string;
  readonly ground: LaidGround;
  /** The member's developed surface, of one of its identical pieces. */
  readonly surface: Surface;
  /** Keys of the parts of the girth it takes by themselves; null for a share of the whole. */
  readonly partKeys: readonly string[] | null;
  /** Share of the surface (or of those parts), 0…1. */
  readonly share: number;
  /** Openings of one member. */
  readonly openings_mm2: number;
  readonly members: number;
  readonly relief: Relief;
  /** How worked the surface of the zone is. */
  readonly finish: SurfaceFinish;
  /** Share (0…1) that is burnished where a zone is both burnished and matte. */
  readonly burnishedShare: number;
  /** True surface ÷ plan surface, as `measure` gives it for this relief and surface. */
  readonly reliefFactor: number;
  /** Null follows shape, relief and width, the cheapest strips and the card's cuts. */
  readonly way: LayingWay | null;
  readonly strips: number | null;
  readonly cuts: number | null;
  /** What laying one piece costs, in the workshop's currency; weighs strips against leaf. */
  readonly pieceCost: number;
}
