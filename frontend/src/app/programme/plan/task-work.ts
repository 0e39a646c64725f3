import type { ProgrammeAnswer } from '#shared/programme/programme-schema';
import { workIdOf } from '#shared/programme/work-id-of';

/** The work a task is part of, and how many hands it takes at once. */
export interface TaskWork {
  readonly workId: string;
  readonly name: string;
  readonly isCarving: boolean;
  /** As it is planned. */
  readonly crew: number;
  /** As it was entered for this work alone; null: as its lot is worked. */
  readonly entered: number | null;
  readonly grade: string;
  /** How many can do it. */
  readonly people: number;
}

/** The work of a task; null where nobody's hands are asked for. */
export function taskWork({ items, request, inputs }: ProgrammeAnswer, taskId: string): TaskWork | null {
  const item = items.find((one) => one.taskId === taskId);
  const task = request.tasks.find(({ id }) => id === taskId);
  if (!item || !task || task.crew === 0) return null;
  const workId = workIdOf(item);
  return {
    ...{ workId, name: item.name, isCarving: item.kind === 'carving', crew: task.crew, grade: item.grade },
    entered: inputs.hands.find((one) => one.workId === workId)?.crew ?? null,
    people: request.people.filter(({ gradeIds }) => gradeIds.includes(task.gradeId)).length,
  };
}
