import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import type { PlaceHold } from '#shared/programme/programme-request';
import type { PromisedWork } from '#shared/programme/promised-work';

/** Work of one job that the workshop has promised: accepted, or offered and held; its plan in the minutes of the board's frame. */
export interface PromisedPlan {
  readonly estimateId: string;
  readonly plan: Programme;
  readonly items: readonly ProgrammeItem[];
  readonly placeHolds: readonly PlaceHold[];
}

const peopleOf = (task: PlannedTask) =>
  task.personIds.flatMap((personId) => task.spans.map((span) => ({ ...span, personId })));

/** Who is at it when, and what room it takes: what other jobs are planned around. */
export function promisedWork({ estimateId, plan, placeHolds }: PromisedPlan): PromisedWork {
  const byId = new Map(plan.tasks.map((task) => [task.taskId, task]));
  return {
    estimateId,
    people: plan.tasks.flatMap(peopleOf),
    places: placeHolds.flatMap(({ placeId, amount, fromTaskId, untilTaskId }) => {
      const [from, until] = [byId.get(fromTaskId), byId.get(untilTaskId)];
      if (!from || !until || until.end_minutes <= from.start_minutes) return [];
      return [{ placeId, amount, start_minutes: from.start_minutes, end_minutes: until.end_minutes }];
    }),
  };
}
