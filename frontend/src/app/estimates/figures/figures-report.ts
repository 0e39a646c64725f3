import { InjectionToken, isDevMode } from '@angular/core';

/** Told where the page and the server worked the same draft differently, which must never be: a test throws. */
export const FIGURES_REPORT = new InjectionToken<(difference: string) => void>('FIGURES_REPORT', {
  providedIn: 'root',
  factory: () => (difference) => {
    if (isDevMode()) console.error('page and server worked it differently:', difference);
  },
});
