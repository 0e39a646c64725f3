import type { PlannedTask, Programme } from '#shared/programme/programme-plan';

/** A task in which two plans of one request differ; minutes of the same frame, null where one of them does not hold it. */
export interface PlanDifference {
  readonly taskId: string;
  readonly before: Pick<PlannedTask, 'start_minutes' | 'end_minutes' | 'personIds'> | null;
  readonly after: Pick<PlannedTask, 'start_minutes' | 'end_minutes' | 'personIds'> | null;
  /** How much later it ends; null where one of them does not hold it. */
  readonly later_minutes: number | null;
}

const shown = (task: PlannedTask | undefined): PlanDifference['before'] =>
  task ? { start_minutes: task.start_minutes, end_minutes: task.end_minutes, personIds: task.personIds } : null;

const isSame = (one: PlannedTask, other: PlannedTask): boolean =>
  one.start_minutes === other.start_minutes &&
  one.end_minutes === other.end_minutes &&
  one.personIds.join() === other.personIds.join();

/** Task by task what another plan moves, in the order of the later plan, what fell away last. */
export function planDifferences(before: Programme, after: Programme): PlanDifference[] {
  const earlier = new Map(before.tasks.map((task) => [task.taskId, task]));
  const later = new Map(after.tasks.map((task) => [task.taskId, task]));
  return [...new Set([...later.keys(), ...earlier.keys()])].flatMap((taskId) => {
    const [one, other] = [earlier.get(taskId), later.get(taskId)];
    if (one && other && isSame(one, other)) return [];
    const later_minutes = one && other ? other.end_minutes - one.end_minutes : null;
    return [{ taskId, before: shown(one), after: shown(other), later_minutes }];
  });
}

/** How much later a plan finishes than another, in minutes; null where one of them has no finish. */
export const finishDifference_minutes = (before: Programme, after: Programme): number | null =>
  before.finish_minutes === null || after.finish_minutes === null ? null : after.finish_minutes - before.finish_minutes;
