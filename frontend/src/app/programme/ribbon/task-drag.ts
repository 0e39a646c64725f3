import { signal } from '@angular/core';
import type { RibbonLot, RibbonTask } from './ribbon-lot';
import { pixelOf, type RibbonScale } from './ribbon-scale';

/** A task that is being moved, and to which minute. */
export interface DraggedTask {
  readonly taskId: string;
  readonly start_minutes: number;
}

/** A pointer that shook is no move. */
const least_px = 5;

/** Moving a task by the pointer: on a grid as fine as the size allows, until it is put down or given up. */
export class TaskDrag {
  private begun: { readonly task: RibbonTask; readonly x: number } | undefined;
  private readonly dragged = signal<DraggedTask | undefined>(undefined);

  readonly at = this.dragged.asReadonly();

  begin(task: RibbonTask, x: number): void {
    this.begun = { task, x };
  }

  /** Where the task would start now; undefined while nothing was moved. */
  move(x: number, hour_px: number): DraggedTask | undefined {
    if (!this.begun || (!this.dragged() && Math.abs(x - this.begun.x) < least_px)) return undefined;
    const step = hour_px >= 30 ? 5 : hour_px >= 8 ? 15 : 60;
    const moved = this.begun.task.start_minutes + ((x - this.begun.x) * 60) / hour_px;
    const next = { taskId: this.begun.task.id, start_minutes: Math.round(moved / step) * step };
    const before = this.dragged();
    if (before?.start_minutes === next.start_minutes) return undefined;
    this.dragged.set(next);
    return next;
  }

  /** Ends the move; the answer is where the task was put, if it was moved at all. */
  end(): DraggedTask | undefined {
    const at = this.dragged();
    this.begun = undefined;
    this.dragged.set(undefined);
    return at;
  }
}

/** The bar of a task that is being moved, on its line; pixels. */
export function draggedBar(lots: readonly RibbonLot[], { taskId, start_minutes }: DraggedTask, scale: RibbonScale) {
  const lot = lots.find(({ tasks }) => tasks.some(({ id }) => id === taskId));
  const task = lot?.tasks.find(({ id }) => id === taskId);
  if (!lot || !task) return undefined;
  const length_px = ((task.end_minutes - task.start_minutes) * scale.hour_px) / 60;
  return { lotId: lot.id, x: pixelOf(start_minutes, scale), width: Math.max(4, length_px) };
}
