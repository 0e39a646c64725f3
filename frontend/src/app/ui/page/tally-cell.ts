import type { UrlTree } from '@angular/router';

/** One place of a job with its live figure; the last one is usually the latest issue and the difference to it. */
export interface TallyCell {
  readonly name: string;
  readonly figure: string;
  readonly minor?: string;
  /** What the minor figure is, where the figure alone does not say it. */
  readonly minorName?: string;
  readonly route: string | readonly unknown[] | UrlTree;
  /** Still being worked out. */
  readonly isPending?: boolean;
  /** Stands back, as the latest issue does. */
  readonly isMuted?: boolean;
}
