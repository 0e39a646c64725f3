import type { RunFit } from '#shared/carving/run-fit';
import type { Triple } from '#shared/units/triple';
import type { Finding } from '#shared/words/finding';
import type { Reason } from '#shared/words/reason';

/** Hours that fall to one grade of labour. */
export interface GradeHours {
  readonly gradeId: string;
  readonly hours: Triple;
}

/** What a row of hours is for: a stage's own id for `stage`, empty otherwise. */
export type CarvingWorkKind =
  'stage' | 'undercutting' | 'pattern' | 'once' | 'shaping' | 'free' | 'sharpening' | 'recutting';

/** Hours of one kind of work by one grade, over the whole estimate. */
export interface CarvingHoursRow {
  readonly kind: CarvingWorkKind;
  readonly stageId: string;
  readonly gradeId: string;
  readonly hours: Triple;
}

/** The hours of one use, over all identical members; pattern, sharpening and recutting stand apart. */
export interface UseHours {
  readonly useId: string;
  readonly ornamentId: string;
  readonly zoneId: string | null;
  /** Pieces, or how often the reference length or reference square goes into it. */
  readonly quantity: number;
  /** How the repeats fall on one run (on each half beside a centrepiece); null where none are fitted. */
  readonly fit: RunFit | null;
  /** Size, timber, relief, undercut and plan together. */
  readonly factor: number;
  /** Its share of the group's learning sum, in first-unit pieces; the quantity itself without learning. */
  readonly learnt: number;
  readonly carving: Triple;
  readonly rows: readonly CarvingHoursRow[];
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}

/** Drawing and pattern of one ornament. */
export interface PatternHours {
  readonly ornamentId: string;
  readonly patterns: number;
  readonly hours: Triple;
}

/** Recutting of one zone. */
export interface RecutHours {
  readonly zoneId: string;
  readonly hours: Triple;
  readonly reasons: readonly Reason[];
}

/** Everything one ornament or item of the card costs in hours, sharpening and recutting included; what a risk draw scales at once. */
export interface OrnamentHours {
  readonly ornamentId: string;
  readonly carving: Triple;
  readonly grades: readonly GradeHours[];
}

/** Carving hours of a whole estimate: low, likely and high of every figure. */
export interface CarvingResult {
  readonly uses: readonly UseHours[];
  readonly patterns: readonly PatternHours[];
  readonly recut: readonly RecutHours[];
  readonly ornaments: readonly OrnamentHours[];
  readonly rows: readonly CarvingHoursRow[];
  readonly grades: readonly GradeHours[];
  readonly sharpening: Triple;
  readonly total: Triple;
  readonly reasons: readonly Reason[];
  readonly findings: readonly Finding[];
}
