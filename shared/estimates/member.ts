import type { RecuttingManner } from '#shared/carving/carving-card';
import type { OrnamentUse } from '#shared/carving/ornament-use';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { Opening } from '#shared/measure/opening';
import type { Relief, SurfaceFinish } from '#shared/measure/relief';
import type { Shape } from '#shared/measure/shape';
import type { ZoneTake } from '#shared/measure/zone-take';

/** How leaf is laid on a zone; `proposed` follows the shape, strips and cuts of null are worked out. */
export interface ZoneLaying {
  readonly way: 'proposed' | LayingWay;
  readonly strips: number | null;
  readonly cuts: number | null;
}

/** A share of a member's surface that gets one build-up. */
export interface Zone {
  readonly id: string;
  readonly name: string;
  readonly take: ZoneTake;
  readonly relief: Relief;
  /** Null takes what the shape and the ornament suggest. */
  readonly finish: SurfaceFinish | null;
  readonly buildUpId: string;
  /** Null where no leaf is chosen. */
  readonly leafId: string | null;
  readonly laying: ZoneLaying;
  /** Optional steps of the build-up done here, by their id. */
  readonly chosenStepIds: readonly string[];
  /** Share burnished of a zone burnished and matte; null takes the card's. */
  readonly burnished_percent: number | null;
  /** Share of the zone that is ornament painted in glazes. */
  readonly painted_percent: number;
  /** Recut in gesso as usual or in the French manner; null: not at all. */
  readonly recutting: RecuttingManner | null;
  /** Edge protected before a second system is begun, per identical piece. */
  readonly protectedEdge_mm: number;
  readonly alternativeId: string | null;
}

/** An ornament as a member carries it, in the base or in one alternative. */
export interface MemberOrnament extends OrnamentUse {
  readonly alternativeId: string | null;
}

/** What a person enters of one member; it is saved, undone and remembered as one. */
export interface MemberContent {
  readonly pieceId: string;
  /** Place within its piece, any finite number. */
  readonly place: number;
  readonly name: string;
  readonly count: number;
  readonly timberId: string;
  readonly shape: Shape;
  readonly openings: readonly Opening[];
  readonly zones: readonly Zone[];
  readonly ornaments: readonly MemberOrnament[];
  /** Name of the lot it is coated with, whatever its build-ups; empty is coated with all of its piece that is built up alike. */
  readonly lot: string;
  readonly note: string;
  /** Lengths as they were typed, by the path of their field: what was written is what is shown again. */
  readonly typed: Readonly<Record<string, string>>;
  readonly alternativeId: string | null;
}

/** The object worked on, with its members. */
export interface PieceContent {
  readonly name: string;
  readonly place: number;
  readonly note: string;
}

export interface Piece extends PieceContent {
  readonly id: string;
}

export interface Member extends MemberContent {
  readonly id: string;
}
