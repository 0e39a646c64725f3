import type { ProgrammeFrame } from '#shared/programme/programme-frame';
import type { TaskMark } from '#shared/programme/programme-inputs';
import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import { groupedBy } from '#shared/units/grouped-by';
import type { RibbonLot, RibbonTask } from '../ribbon/ribbon-lot';
import type { TaskWords } from './task-words';

/** What the lines of a programme are drawn from. */
export interface ShownPlan {
  readonly plan: Programme;
  readonly items: readonly ProgrammeItem[];
  readonly marks: readonly TaskMark[];
  readonly pinnedIds: ReadonlySet<string>;
  readonly people: ReadonlyMap<string, string>;
  readonly frame: ProgrammeFrame;
  readonly mayMove: boolean;
}

/** A window is open from when a coat is dry until it closes; from coat to coat it is told and not outlined, since the next coat lies within. */
function windowOf(
  { coat, coats }: ProgrammeItem,
  { end_minutes, dryUntil_minutes, windowUntil_minutes }: PlannedTask,
): RibbonTask['window'] {
  if (coat < coats) return null;
  const start_minutes = dryUntil_minutes ?? end_minutes;
  return windowUntil_minutes !== null && windowUntil_minutes > start_minutes
    ? { start_minutes, end_minutes: windowUntil_minutes }
    : null;
}

/** Where a task stands by what was marked at the bench. */
export function stateOf(marks: readonly TaskMark[], taskId: string): 'planned' | 'started' | 'finished' {
  const mark = marks.find((one) => one.taskId === taskId);
  return mark === undefined ? 'planned' : mark.endedAt === null ? 'started' : 'finished';
}

function ribbonTask(item: ProgrammeItem, task: PlannedTask, shown: ShownPlan & { words: TaskWords }): RibbonTask {
  const state = stateOf(shown.marks, item.taskId);
  const isPinned = shown.pinnedIds.has(item.taskId);
  return {
    ...{ id: item.taskId, name: shown.words.name(item), label: shown.words.label(item) },
    ...{ start_minutes: task.start_minutes, end_minutes: task.end_minutes, spans: task.spans },
    ...{ dryUntil_minutes: task.dryUntil_minutes, window: windowOf(item, task) },
    ...{ look: state === 'finished' ? 'done' : 'planned', isPinned, isCritical: task.isCritical },
    isMovable: shown.mayMove && state === 'planned',
    story: shown.words.story({ ...shown, item, task, state, isPinned }),
  };
}

/** The lines of a programme: a lot or a carved member each, in the order of their first work, every task with its story. */
export function programmeLots(shown: ShownPlan, words: TaskWords): RibbonLot[] {
  const planned = new Map(shown.plan.tasks.map((task) => [task.taskId, task]));
  const severalPieces = new Set(shown.items.map(({ pieceId }) => pieceId)).size > 1;
  const drawn = shown.items.filter(({ kind, taskId }) => kind !== 'carved' && planned.has(taskId));
  const lots = [...groupedBy(drawn, ({ lotId }) => lotId)].map(([id, items]): RibbonLot => {
    const tasks = items
      .map((item) => ribbonTask(item, planned.get(item.taskId) as PlannedTask, { ...shown, words }))
      .sort((one, other) => one.start_minutes - other.start_minutes);
    const [{ lot, piece, kind, grade }] = items;
    const minor = kind === 'carving' ? grade : severalPieces ? piece : '';
    return { id, name: lot, minor, link: null, tasks };
  });
  return lots.sort((one, other) => one.tasks[0].start_minutes - other.tasks[0].start_minutes);
}
