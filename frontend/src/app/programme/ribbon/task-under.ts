import type { DrawnLot, DrawnTask } from './laid-tasks';

const far = ({ work, touch }: DrawnTask, x: number): number =>
  work.length === 0
    ? Math.abs(touch.x + touch.width / 2 - x)
    : Math.min(...work.map((one) => Math.max(one.x - x, x - one.x - one.width, 0)));

/**
 * The task a pointer is at. Where tasks are small, what may be pressed of one lies over its neighbours; then it is the one whose work is nearest, and of
 * those that lie together the one it is told to be at.
 */
export function taskUnder(rows: readonly DrawnLot[], taskId: string, x: number): DrawnTask | undefined {
  const row = rows.find(({ tasks }) => tasks.some(({ task }) => task.id === taskId));
  const told = row?.tasks.find(({ task }) => task.id === taskId);
  if (!row || !told) return undefined;
  const near = row.tasks.filter(({ touch }) => touch.x <= x && x <= touch.x + touch.width);
  return near.reduce((best, one) => (far(one, x) < far(best, x) ? one : best), told);
}
