import { InjectionToken, Injector, inject } from '@angular/core';
import type { Edit } from './edit';

/** One item two people changed: what this page made of it, and what is kept now (null: taken away). */
export interface Conflict {
  readonly mine: Edit;
  readonly theirs: Edit['content'];
}

export type Side = 'mine' | 'theirs';

/** Asks which side of a conflict is to stand; the dialog is loaded when it is needed. */
export const STALE_CHOICE = new InjectionToken<(conflict: Conflict) => Promise<Side>>('STALE_CHOICE', {
  providedIn: 'root',
  factory: () => {
    const injector = inject(Injector);
    return async (conflict) => {
      const { askWhichSide } = await import('./stale-dialog');
      return askWhichSide(injector, conflict);
    };
  },
});
