import type { LaidGround } from '#shared/leaf/laid-ground';
import type { LaysLaying } from '#shared/leaf/lays-laying';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { PatchesLaying } from '#shared/leaf/patches-laying';
import type { RibbonLaying } from '#shared/leaf/ribbon-laying';
import type { SheetsLaying } from '#shared/leaf/sheets-laying';
import type { ZoneLosses } from '#shared/leaf/zone-losses';
import type { Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** How the leaf was counted on one member, before relief and share. */
export type Laying = SheetsLaying | LaysLaying | PatchesLaying | RibbonLaying;

/** Leaf of one zone over all identical members; leaves are not rounded, of ribbon a leaf is a roll. */
export interface ZoneLeaf {
  readonly zoneId: string;
  readonly productId: string;
  readonly ground: LaidGround;
  /** The way whose losses count; ribbon is laid as sheets are. */
  readonly way: LayingWay;
  /** Null where nothing could be counted; a finding says why. */
  readonly laying: Laying | null;
  /** After openings and share, over all members; the true area has the relief in it. */
  readonly planArea_mm2: number;
  readonly trueArea_mm2: number;
  readonly netLeaves: number;
  readonly losses: ZoneLosses;
  readonly grossLeaves: Triple;
  /** With every loss at its own tenth and ninetieth percentile. */
  readonly grossLeaves_p10: number;
  readonly grossLeaves_p90: number;
  /** What laying minutes go by: gross leaves (sheets, patches), gross strips (lays), gross metres (ribbon). */
  readonly handled: Triple;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}
