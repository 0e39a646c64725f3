import { isHeldByPin } from '#shared/programme/is-held-by-pin';
import type { ProgrammeLag, ProgrammeRequest, ProgrammeTask } from '#shared/programme/programme-request';

/** The tasks that most lags tie to one, directly or through others, with itself; none of those that have happened or are pinned. */
export function tasksTiedTo(request: ProgrammeRequest, taskId: string): ReadonlySet<string> {
  const { tasks, lags } = request;
  const movable = new Set(tasks.filter((task) => !task.happened && !isHeldByPin(task, request)).map(({ id }) => id));
  const ties = lags.filter(
    ({ most, fromTaskId, toTaskId }) => most !== null && movable.has(fromTaskId) && movable.has(toTaskId),
  );
  const tied = new Set(movable.has(taskId) ? [taskId] : []);
  for (let before = -1; before !== tied.size;) {
    before = tied.size;
    for (const { fromTaskId, toTaskId } of ties)
      if (tied.has(fromTaskId) || tied.has(toTaskId)) tied.add(fromTaskId).add(toTaskId);
  }
  return tied;
}

const portionId = (id: string, portion: number): string => `${id}#${portion}`;

/** Task or lag or hold of a portion: whatever it says of split tasks says it of those of its portion. */
function ofPortion<T extends { readonly fromTaskId: string }>(
  one: T,
  ids: {
    readonly to: 'toTaskId' | 'untilTaskId';
    readonly split: ReadonlySet<string>;
    readonly portions: readonly number[];
  },
): T[] {
  const target = (one as unknown as Record<string, string>)[ids.to];
  const [isFrom, isTo] = [ids.split.has(one.fromTaskId), ids.split.has(target)];
  if (!isFrom && !isTo) return [one];
  return ids.portions.map((portion) => ({
    ...one,
    fromTaskId: isFrom ? portionId(one.fromTaskId, portion) : one.fromTaskId,
    [ids.to]: isTo ? portionId(target, portion) : target,
  }));
}

function taskPortions(task: ProgrammeTask, portions: readonly number[]): ProgrammeTask[] {
  return portions.map((portion) => ({
    ...task,
    id: portionId(task.id, portion),
    handsOn_minutes: Math.ceil(task.handsOn_minutes / portions.length),
  }));
}

/**
 * A request in which a task and all that is tied to it are done in so many portions, each with its own windows; ids of portions end in # and their number.
 * Hands-on minutes are parted evenly, rounded up; set-up of each portion is not added.
 */
export function inPortions(request: ProgrammeRequest, taskId: string, count: number): ProgrammeRequest {
  const split = tasksTiedTo(request, taskId);
  const portions = Array.from({ length: count }, (_, at) => at + 1);
  const lagIds = { to: 'toTaskId', split, portions } as const;
  const holdIds = { to: 'untilTaskId', split, portions } as const;
  return {
    ...request,
    tasks: request.tasks.flatMap((task) => (split.has(task.id) ? taskPortions(task, portions) : [task])),
    lags: request.lags.flatMap((lag) => ofPortion<ProgrammeLag>(lag, lagIds)),
    placeHolds: request.placeHolds.flatMap((hold) => ofPortion(hold, holdIds)),
    approvals: request.approvals.flatMap((hold) =>
      split.has(hold.beforeTaskId)
        ? portions.map((portion) => ({ ...hold, beforeTaskId: portionId(hold.beforeTaskId, portion) }))
        : [hold],
    ),
  };
}
