import type { PlannedTask } from '#shared/programme/programme-plan';

/** From when to when a task was done; `end_minutes` null while it is in work. */
export interface DoneAsPlanned {
  readonly start_minutes: number;
  readonly end_minutes: number | null;
}

/** Where a task stands at a moment if all of it went as it was planned; null where it was not to have begun by then. */
export function standAsPlanned({ start_minutes, end_minutes }: PlannedTask, now_minutes: number): DoneAsPlanned | null {
  if (start_minutes >= now_minutes) return null;
  return { start_minutes, end_minutes: end_minutes <= now_minutes ? end_minutes : null };
}
