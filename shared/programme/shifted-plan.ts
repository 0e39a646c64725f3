import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import type { MomentSpan } from '#shared/programme/shop-calendar';

const shiftedSpan = ({ start_minutes, end_minutes }: MomentSpan, by: number): MomentSpan => ({
  start_minutes: start_minutes + by,
  end_minutes: end_minutes + by,
});

const shiftedOrOpen = (minutes: number | null, by: number): number | null => (minutes === null ? null : minutes + by);

const shiftedTask = (task: PlannedTask, by: number): PlannedTask => ({
  ...task,
  ...shiftedSpan(task, by),
  spans: task.spans.map((span) => shiftedSpan(span, by)),
  dryUntil_minutes: shiftedOrOpen(task.dryUntil_minutes, by),
  windowUntil_minutes: shiftedOrOpen(task.windowUntil_minutes, by),
});

/** The same plan told in the minutes of another frame, so many later (`minutesBetween`). */
export const shiftedPlan = (plan: Programme, by_minutes: number): Programme =>
  by_minutes === 0
    ? plan
    : {
        ...plan,
        tasks: plan.tasks.map((task) => shiftedTask(task, by_minutes)),
        from_minutes: plan.from_minutes + by_minutes,
        start_minutes: plan.start_minutes + by_minutes,
        finish_minutes: shiftedOrOpen(plan.finish_minutes, by_minutes),
        lowerBound_minutes: plan.lowerBound_minutes + by_minutes,
      };
