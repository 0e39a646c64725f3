import { EnvironmentInjector, inject, runInInjectionContext } from '@angular/core';
import type { CanDeactivateFn, GuardResult } from '@angular/router';
import { leaveGuard } from '../../ui/dialog/leave-guard';
import type { WorkspacePage } from './workspace-page';

/** Sends what was typed before an estimate is left; only what the server does not take in time is asked about. */
export const keptGuard: CanDeactivateFn<WorkspacePage> = async (...given) => {
  const injector = inject(EnvironmentInjector);
  await given[0].keep();
  return runInInjectionContext(injector, () => leaveGuard(...given)) as Promise<GuardResult>;
};
