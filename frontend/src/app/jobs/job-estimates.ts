import { InjectionToken, type Type } from '@angular/core';

/**
 * The widget that shows a job's estimates on the page of the job and begins new ones. `estimates` comes later in the list of features,
 * so `app-config.ts` supplies it; it is loaded when a job is opened, and given the job as its input `job`.
 */
export const JOB_ESTIMATES = new InjectionToken<() => Promise<Type<unknown>>>('JOB_ESTIMATES');
