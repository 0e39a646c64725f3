import { InjectionToken, Injector, inject } from '@angular/core';
import type { Conflict, Side } from './conflict';

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
