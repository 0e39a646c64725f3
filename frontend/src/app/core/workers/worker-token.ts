import { InjectionToken } from '@angular/core';

/** Starts a worker; the promise lets its one line, `new Worker(new URL(…))`, stand alone in a file reached by `import()`. */
export type WorkerStarter = () => Promise<Worker>;

/** The token a feature asks its worker through, so that a test may answer in its place. */
export const workerToken = (name: string, start: WorkerStarter): InjectionToken<WorkerStarter> =>
  new InjectionToken<WorkerStarter>(name, { providedIn: 'root', factory: () => start });
