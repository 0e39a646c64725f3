import { InjectionToken } from '@angular/core';

/** The present moment, asked for through a token so that a test may choose it. */
export const NOW = new InjectionToken<() => Date>('NOW', { providedIn: 'root', factory: () => () => new Date() });
