import { programme } from '#shared/programme/programme';
import type { Programme } from '#shared/programme/programme-plan';
import { programmeRemedies, type Remedy } from '#shared/programme/programme-remedies';
import type { ProgrammeRequest, ProgrammeSearch } from '#shared/programme/programme-request';

/** What is planned, and for how long a better plan is looked for; `helpsTask`: what would help this task is tried instead. */
export interface PlanningQuestion {
  readonly request: ProgrammeRequest;
  readonly search: Omit<ProgrammeSearch, 'limit' | 'onBetter'>;
  readonly seconds: number;
  readonly helpsTask?: string;
}

export type PlanningAnswer =
  { readonly better: Programme } | { readonly plan: Programme } | { readonly remedies: readonly Remedy[] };

const tell = (answer: PlanningAnswer): void => postMessage(answer);

/** Plans away from the page, and tells of each better plan on the way. */
addEventListener('message', ({ data }: MessageEvent<PlanningQuestion>) => {
  const { request, search, seconds, helpsTask } = data;
  if (helpsTask !== undefined) {
    tell({ remedies: programmeRemedies(request, helpsTask, { otherSizes: [] }) });
    return;
  }
  const ends_milliseconds = performance.now() + seconds * 1000;
  const limit = { shouldStop: () => performance.now() >= ends_milliseconds };
  tell({ plan: programme(request, { ...search, limit, onBetter: (better) => tell({ better }) }) });
});
