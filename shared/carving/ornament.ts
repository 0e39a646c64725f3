import type { Relief } from '#shared/measure/relief';
import type { Triple } from '#shared/units/triple';

/** What an ornament's hours are counted by: the piece, the length of run, or the area carved. */
export const ornamentWays = ['piece', 'length', 'area'] as const;
export type OrnamentWay = (typeof ornamentWays)[number];

/** A carved enrichment of the rate card; its hours hold in the reference timber (factor 1.00) and at its own reference relief. */
export interface Ornament {
  readonly id: string;
  readonly name: string;
  readonly way: OrnamentWay;
  /** `piece`: the module the hours are for; `length`: the length they are for; `area`: the side of the square they are for. */
  readonly reference_mm: number;
  readonly relief: Relief;
  /** Hours of the first piece, or of each reference length or reference square. */
  readonly hours: Triple;
  /** Drawing and pattern, once for each ornament. */
  readonly patternHours: Triple;
  /** Repeats along a run: hours go on falling further before the learning plateau. */
  readonly isRunning: boolean;
}

/** `once`: drawing, model, jig, trial piece; `shaping`: a member from the block; `free`: figures and free carving. */
export const carvingItemKinds = ['once', 'shaping', 'free'] as const;
export type CarvingItemKind = (typeof carvingItemKinds)[number];

/** Work that is no repeated ornament: it has hours and a grade of its own, and no learning, relief or stages. */
export interface CarvingItem {
  readonly id: string;
  readonly name: string;
  readonly kind: CarvingItemKind;
  readonly way: OrnamentWay;
  /** As in an ornament; a piece is scaled by its size from here, null where size does not matter. */
  readonly reference_mm: number | null;
  readonly hours: Triple;
  readonly gradeId: string;
}
