import type { StepKind } from '#shared/buildups/buildup';

/** What a task of a programme is, for whoever reads it: a coat of a step on a lot, or the carving of a member by one grade. */
export interface ProgrammeItem {
  readonly taskId: string;
  /** The lot, or the member that is carved. */
  readonly lotId: string;
  readonly lot: string;
  readonly pieceId: string;
  readonly piece: string;
  readonly memberIds: readonly string[];
  /** `carved`: nothing but the moment at which the carving of a member ends. */
  readonly kind: 'carving' | 'carved' | StepKind;
  readonly stepId: string | null;
  readonly name: string;
  readonly coat: number;
  readonly coats: number;
  readonly portion: number;
  readonly portions: number;
  readonly gradeId: string;
  readonly grade: string;
  readonly handsOn_minutes: number;
}
