import { computed, signal, type Signal } from '@angular/core';
import type { DrawnLot, DrawnTask } from './laid-tasks';
import type { RibbonTask } from './ribbon-lot';
import { storyPlace } from './story-place';
import { TaskDrag, type DraggedTask } from './task-drag';
import { taskUnder } from './task-under';

/** The task whose story is told, and where on the screen. */
interface Told {
  readonly task: RibbonTask;
  readonly x: number;
  readonly y: number;
}

const drawnTask = (rows: readonly DrawnLot[], id: string): (DrawnTask & { readonly y: number }) | undefined => {
  const row = rows.find(({ tasks }) => tasks.some(({ task }) => task.id === id));
  const found = row?.tasks.find(({ task }) => task.id === id);
  return row && found && { ...found, y: row.y };
};

/** What a pointer does on a ribbon: it points at a task, which tells its story, presses it, and moves it. */
export class RibbonPointer {
  private readonly dragging = new TaskDrag();
  private readonly story = signal<Told | undefined>(undefined);

  readonly told = this.story.asReadonly();
  readonly dragged = this.dragging.at;
  /** What lies under the pointer, in pixels of the sheet. */
  readonly pointed = computed(() => {
    const id = this.told()?.task.id;
    const one = id === undefined ? undefined : drawnTask(this.rows(), id);
    return one && { ...one.touch, y: one.y + 6 };
  });

  constructor(
    private readonly rows: Signal<readonly DrawnLot[]>,
    private readonly stretch: Signal<number>,
  ) {}

  /** The task at a pointer; a press without a place (by a reading program) is of what it was made on. */
  taskAt({ target, clientX, type, detail }: MouseEvent): RibbonTask | undefined {
    const element = (target as Element).closest('[data-task]');
    const [id, sheet] = [element?.getAttribute('data-task'), element?.closest('svg')];
    if (!id || !sheet) return undefined;
    const hasPlace = type !== 'click' || detail > 0;
    const x = hasPlace ? (clientX - sheet.getBoundingClientRect().left) / this.stretch() : Number.NaN;
    return taskUnder(this.rows(), id, x)?.task;
  }

  grip(event: PointerEvent): void {
    const task = this.taskAt(event);
    if (!task?.isMovable || event.button !== 0 || event.pointerType === 'touch') return;
    this.dragging.begin(task, event.clientX);
  }

  /** Moves what was gripped, else tells of what it comes to; answers where a task was moved to. */
  move(event: PointerEvent, hour_px: number): DraggedTask | undefined {
    const moved = this.dragging.move(event.clientX, hour_px);
    if (moved || this.dragged() || event.pointerType === 'touch') {
      this.hush();
      return moved;
    }
    const task = this.taskAt(event);
    if (task?.id !== this.told()?.task.id) this.tell(task, { x: event.clientX + 14, y: event.clientY + 18 });
    return undefined;
  }

  /** Ends moving; answers where the task was put, if it was moved at all. */
  release(): DraggedTask | undefined {
    return this.dragging.end();
  }

  tell(task: RibbonTask | undefined, at: { readonly x: number; readonly y: number }): void {
    this.story.set(task && { task, ...storyPlace(at, { width: innerWidth, height: innerHeight }) });
  }

  hush(): void {
    this.story.set(undefined);
  }
}
