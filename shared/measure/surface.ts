import type { Reason } from '#shared/words/reason';

/** A part of a moulding's girth (this fillet, that ovolo) that a zone may take by itself. */
export interface SurfacePart {
  /** Stable key within the shape, the id of the profile element. */
  readonly key: string;
  /** The classical name of the element, as in `profile.ts`. */
  readonly element: string;
  readonly girth_mm: number;
  readonly area_mm2: number;
}

/** A flat or unrolled field that leaf is laid on by courses: a rectangle, or a band (closed when it runs round). */
export interface Course {
  readonly length_mm: number;
  readonly height_mm: number;
  readonly closed: boolean;
}

/** The developed surface of one member of a shape, in mm and mm², before openings, count, share and relief. */
export interface Surface {
  readonly area_mm2: number;
  /** Girth across and run along, where the shape has them. */
  readonly girth_mm?: number;
  readonly run_mm?: number;
  /** Chosen ends of a leg or cone: counted in the area, but not in girth × run. */
  readonly ends_mm2?: number;
  readonly closedRun: boolean;
  /** Straight sides of the run, joined for laying and for planning carved repeats; one entry where the run is single. */
  readonly sides_mm: readonly number[];
  readonly parts: readonly SurfacePart[];
  /** The rectangle round a flat face that has no run, so that small ones can be cut from a leaf. */
  readonly bounds_mm?: { readonly length: number; readonly height: number };
  /** Fields laid by courses; empty for every other shape. */
  readonly courses: readonly Course[];
  /** How leaf is usually laid on its form; relief and width of a zone may propose another way. */
  readonly laying: 'sheets' | 'lays' | 'patches';
  readonly finish: 'plain' | 'moulded' | 'carved';
  /** Already the true surface (measured in the round): relief in the round counts 1.00. */
  readonly isTrueSurface: boolean;
  readonly uncertainty_mm2?: number;
  readonly reasons: readonly Reason[];
}
