import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { verifiedPlan } from '#shared/programme/verified-plan';
import type { Finding } from '#shared/words/finding';

/** A task put to a moment, or set free (null). */
export interface Pinned {
  readonly taskId: string;
  readonly start_minutes: number | null;
}

/** The request with a task put to a moment. */
export const pinnedRequest = (request: ProgrammeRequest, { taskId, start_minutes }: Pinned): ProgrammeRequest => ({
  ...request,
  tasks: request.tasks.map((task) => (task.id === taskId ? { ...task, pinned_minutes: start_minutes } : task)),
});

/** Whether a moment was over before anything is planned. */
export const isPast = (start_minutes: number | null, request: ProgrammeRequest): boolean =>
  start_minutes !== null && start_minutes < request.start_minutes;

/** What becomes of a plan when one task of it stands elsewhere: what the task itself breaks, and what would have to move along. */
export interface MovedConsequences {
  readonly impossible: readonly Finding[];
  readonly follows: readonly Finding[];
}

/** A plan with one task elsewhere, everything else where it was. */
function movedPlan(plan: Programme, taskId: string, start_minutes: number): Programme {
  const tasks = plan.tasks.map((task) => {
    if (task.taskId !== taskId) return task;
    const by = start_minutes - task.start_minutes;
    return { ...task, start_minutes, end_minutes: task.end_minutes + by };
  });
  return { ...plan, tasks };
}

function inThePast({ tasks }: ProgrammeRequest, about: string): Finding {
  const task = tasks.find(({ id }) => id === about)?.name ?? about;
  return { kind: 'refuse', code: 'programme-breaks-past', values: { task }, about };
}

/** Checks a task at another moment against every rule at once, leaving aside what was broken before. */
export function movedConsequences(
  plan: Programme,
  request: ProgrammeRequest,
  moved: { readonly taskId: string; readonly start_minutes: number },
): MovedConsequences {
  if (isPast(moved.start_minutes, request)) return { impossible: [inThePast(request, moved.taskId)], follows: [] };
  const before = new Set(verifiedPlan(plan, request).broken.map((finding) => JSON.stringify(finding)));
  const { broken } = verifiedPlan(movedPlan(plan, moved.taskId, moved.start_minutes), request);
  const found = broken.filter((finding) => !before.has(JSON.stringify(finding)));
  return {
    impossible: found.filter(({ about }) => about === moved.taskId),
    follows: found.filter(({ about }) => about !== moved.taskId),
  };
}
