import type { LaidGround } from '#shared/leaf/laid-ground';
import type { LaysLaying } from '#shared/leaf/lays-laying';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { PatchesLaying } from '#shared/leaf/patches-laying';
import type { RibbonLaying } from '#shared/leaf/ribbon-laying';
import type { SheetsLaying } from '#shared/leaf/sheets-laying';
import type { Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** How the leaf was counted on one member, before relief and share. */
export type Laying = SheetsLaying | LaysLaying | PatchesLaying | RibbonLaying;

/** The three losses of a way of laying and a finish, in percent. */
export interface ZoneLosses {
  readonly breakage_percent: Triple;
  readonly faulting_percent: Triple;
  readonly second_percent: Triple;
}

/** Leaf of one zone over all identical members; leaves are not rounded. */
export interface ZoneLeaf {
  readonly zoneId: string;
  readonly productId: string;
  readonly ground: LaidGround;
  readonly way: LayingWay;
  readonly laying: Laying;
  /** After openings and share, over all members; true area with relief. */
  readonly planArea_mm2: number;
  readonly trueArea_mm2: number;
  readonly netLeaves: number;
  readonly losses: ZoneLosses;
  readonly grossLeaves: Triple;
  /** With every loss at its own tenth and ninetieth percentile. */
  readonly grossLeaves_p10: number;
  readonly grossLeaves_p90: number;
  /** Pieces handled in laying the gross leaves: leaves, strips or cuts. */
  readonly grossPieces: Triple;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}
