import type { RecuttingManner } from '#shared/carving/carving-card';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { LeafForm } from '#shared/leaf/leaf-product';
import type { SurfaceFinish } from '#shared/measure/relief';

/** Gross leaves (sheets, patches), pieces (lays) or metres (ribbon) of each laying of a zone, broken ones included, unrounded. */
export interface LayingCounts {
  readonly first: number;
  readonly faulting: number;
  readonly second: number;
}

/** How a zone is laid, and how much of it. */
export interface ZoneLaying {
  readonly way: LayingWay;
  readonly form: LeafForm;
  readonly counts: LayingCounts;
}

/** What a build-up is worked on: a zone with all its identical members counted in, areas in mm², hours decimal. */
export interface ZoneFacts {
  readonly id: string;
  readonly pieceId: string;
  readonly buildUpId: string;
  /** The lot its member names to be coated with; empty follows piece and build-up. */
  readonly lot: string;
  /** Plan area (net, before relief) for hands-on work, and true area (with relief) for materials. */
  readonly plan_mm2: number;
  readonly true_mm2: number;
  readonly finish: SurfaceFinish;
  readonly recutting: RecuttingManner | null;
  /** Hours of recutting as the carving worked them; 0 where none. */
  readonly recutting_hours: number;
  readonly laying: ZoneLaying | null;
  /** Plan area of ornament painted in glazes. */
  readonly paintedOrnament_mm2: number;
  /** Length of edge protected between two systems. */
  readonly protectedEdge_mm: number;
  /** Share burnished of a zone burnished and matte; null takes the card's. */
  readonly burnished_percent: number | null;
  readonly chosenStepIds: readonly string[];
  /** The leaf has to be sealed, so optional seals are done. */
  readonly needsSeal: boolean;
  readonly isRestoration: boolean;
  readonly isOutdoorsOrWet: boolean;
}
