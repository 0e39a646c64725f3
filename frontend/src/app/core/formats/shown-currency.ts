import { InjectionToken, type Signal, signal } from '@angular/core';

/** The currency of what a page shows, where that need not be the one the books are kept in today; undefined is the workshop's. */
export const SHOWN_CURRENCY = new InjectionToken<Signal<string | undefined>>('SHOWN_CURRENCY', {
  providedIn: 'root',
  factory: () => signal(undefined),
});
