import type { TaskMark } from '#shared/programme/programme-inputs';
import type { Programme } from '#shared/programme/programme-plan';
import { standAsPlanned } from '#shared/programme/stand-as-planned';

/** A plan with what is marked of it, at a moment. */
export interface MarkedPlan {
  readonly plan: Programme;
  readonly marks: readonly TaskMark[];
  readonly now_minutes: number;
}

/**
 * The tasks of a plan that should have begun by now, or been finished, as far as anybody has marked nothing of them; what nobody has a hand in is not
 * marked. In the order of their starts.
 */
export function unmarkedTasks({ plan, marks, now_minutes }: MarkedPlan): string[] {
  const marked = new Set(marks.map(({ taskId }) => taskId));
  return plan.tasks
    .filter(({ personIds }) => personIds.length > 0)
    .filter((task) => standAsPlanned(task, now_minutes) !== null && !marked.has(task.taskId))
    .sort((one, other) => one.start_minutes - other.start_minutes || one.taskId.localeCompare(other.taskId))
    .map(({ taskId }) => taskId);
}
