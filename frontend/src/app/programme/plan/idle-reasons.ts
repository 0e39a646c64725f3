import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { Programme } from '#shared/programme/programme-plan';
import { groupedBy } from '#shared/units/grouped-by';
import type { Reason } from '#shared/words/reason';

/** A time in which nothing is done to a lot, and why its next task does not start earlier. */
export interface IdleReason {
  readonly item: ProgrammeItem;
  readonly idle_minutes: number;
  readonly waits: readonly Reason[];
}

/** A working day in which nothing happens is worth a sentence. */
const least_minutes = 12 * 60;

/** The longest idle times of a plan before what is critical, so many of them; longest first. */
export function idleReasons(plan: Programme, items: readonly ProgrammeItem[], most: number): IdleReason[] {
  const itemOf = new Map(items.map((item) => [item.taskId, item]));
  const known = plan.tasks.filter(({ taskId, personIds }) => itemOf.has(taskId) && personIds.length > 0);
  const byLot = groupedBy(known, ({ taskId }) => itemOf.get(taskId)?.lotId ?? '');
  const all = [...byLot.values()].flatMap((tasks) => {
    const inOrder = [...tasks].sort((one, other) => one.start_minutes - other.start_minutes);
    return inOrder.slice(1).flatMap((task, at): IdleReason[] => {
      const item = itemOf.get(task.taskId);
      const idle_minutes = task.start_minutes - inOrder[at].end_minutes;
      return item && task.isCritical && idle_minutes >= least_minutes && task.waits.length > 0
        ? [{ item, idle_minutes, waits: task.waits }]
        : [];
    });
  });
  return all.sort((one, other) => other.idle_minutes - one.idle_minutes).slice(0, most);
}
