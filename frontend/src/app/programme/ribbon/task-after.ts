import type { RibbonLot, RibbonTask } from './ribbon-lot';

/** The task an arrow key leads to: along its line, or to the line above or below at about the same time. */
export function taskAfter(lots: readonly RibbonLot[], taskId: string, key: string): RibbonTask | undefined {
  const line = lots.findIndex(({ tasks }) => tasks.some(({ id }) => id === taskId));
  const tasks = lots.at(line)?.tasks ?? [];
  const at = tasks.findIndex(({ id }) => id === taskId);
  if (line < 0 || at < 0) return undefined;
  if (key === 'ArrowRight') return tasks[at + 1];
  if (key === 'ArrowLeft') return tasks[at - 1];
  if (key === 'Home') return tasks[0];
  if (key === 'End') return tasks[tasks.length - 1];
  if (key === 'ArrowDown') return nearest(lots.slice(line + 1), tasks[at]);
  if (key === 'ArrowUp') return nearest(lots.slice(0, line).reverse(), tasks[at]);
  return undefined;
}

function nearest(lots: readonly RibbonLot[], { start_minutes }: RibbonTask): RibbonTask | undefined {
  const tasks = lots.find((lot) => lot.tasks.length > 0)?.tasks ?? [];
  const far = (task: RibbonTask): number => Math.abs(task.start_minutes - start_minutes);
  return tasks.reduce<RibbonTask | undefined>((best, one) => (!best || far(one) < far(best) ? one : best), undefined);
}
