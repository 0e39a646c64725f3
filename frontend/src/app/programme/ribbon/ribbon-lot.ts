import type { MomentSpan } from '#shared/programme/shop-calendar';

/** One task as it is drawn, in minutes from the start of the first day shown; `story` is all there is to tell of it, a sentence each. */
export interface RibbonTask {
  readonly id: string;
  readonly name: string;
  /** Under its bar; empty where the bar beside it says the same. */
  readonly label: string;
  readonly start_minutes: number;
  readonly end_minutes: number;
  readonly spans: readonly MomentSpan[];
  readonly dryUntil_minutes: number | null;
  readonly window: MomentSpan | null;
  readonly look: 'planned' | 'done' | 'held';
  readonly isPinned: boolean;
  readonly isCritical: boolean;
  readonly isMovable: boolean;
  readonly story: readonly string[];
}

/** One line of the ribbon: a lot, a carving, or a job. */
export interface RibbonLot {
  readonly id: string;
  readonly name: string;
  readonly minor: string;
  /** Where its name leads, if anywhere. */
  readonly link: readonly string[] | null;
  readonly tasks: readonly RibbonTask[];
}
