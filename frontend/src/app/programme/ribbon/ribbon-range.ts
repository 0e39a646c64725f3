import type { RibbonLot } from './ribbon-lot';

const day_minutes = 1440;

/** From the day of the first task, or of now where that is earlier, to a day after everything is dry; minutes. */
export function ribbonRange(lots: readonly RibbonLot[], now_minutes: number | undefined) {
  const tasks = lots.flatMap((lot) => lot.tasks);
  const start = Math.min(...tasks.map((task) => task.start_minutes), now_minutes ?? Infinity);
  const end = Math.max(0, ...tasks.map((task) => Math.max(task.end_minutes, task.dryUntil_minutes ?? 0)));
  const first_minutes = Number.isFinite(start) ? Math.floor(start / day_minutes) * day_minutes : 0;
  return { first_minutes, last_minutes: Math.max(end, first_minutes) + day_minutes };
}
