import type { Programme } from '#shared/programme/programme-plan';
import type { Remedy } from '#shared/programme/programme-remedies';
import type { OtherSize, ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';

/** What is planned, and for how long a better plan is looked for; `helpsTask`: what would help this task (null: all of it) is tried instead, other sizes among it. */
export interface PagePlanning {
  readonly request: ProgrammeRequest;
  readonly search: Omit<ProgrammeSearch, 'limit' | 'onBetter'>;
  readonly seconds: number;
  readonly helpsTask?: string | null;
  readonly otherSizes?: readonly OtherSize[];
}

export type PagePlanningAnswer =
  { readonly better: Programme } | { readonly plan: Programme } | { readonly remedies: readonly Remedy[] };
