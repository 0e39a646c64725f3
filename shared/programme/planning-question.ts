import type { ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';

/** What a thread plans, and for how long; its stop is shared memory, so that it is seen in the midst of planning. */
export interface PlanningQuestion {
  readonly request: ProgrammeRequest;
  readonly search: Omit<ProgrammeSearch, 'limit' | 'onBetter'>;
  readonly seconds: number;
  readonly stop: SharedArrayBuffer;
}
