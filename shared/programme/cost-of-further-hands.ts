import { D, type MinorUnits } from '#shared/money/decimal';
import { exactFigure } from '#shared/money/exact-figure';
import { exactMinor } from '#shared/money/minor-of';
import { roundMinor } from '#shared/money/round-minor';
import { dayOfMinutes, type ProgrammeFrame } from '#shared/programme/programme-frame';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { HandRate } from '#shared/programme/what-if';

/** What further hands are reckoned with: rates of the card, set-up hours of one person on one day, digits of the currency. */
export interface FurtherHandsAsked {
  readonly request: ProgrammeRequest;
  readonly frame: ProgrammeFrame;
  readonly rates: readonly HandRate[];
  readonly setUp_hours: number;
  readonly digits: number;
}

/**
 * What it costs to set up people beyond a task's crew, in minor units rounded half up once: each of them once for each day of a task. The hands-on
 * itself is the same whoever shares it (house rule, no source).
 */
export function costOfFurtherHands(plan: Programme, asked: FurtherHandsAsked): MinorUnits {
  const tasks = new Map(asked.request.tasks.map((task) => [task.id, task]));
  let cost = new D(0);
  for (const { taskId, personIds, spans } of plan.tasks) {
    const task = tasks.get(taskId);
    const further = task && task.crew > 0 ? Math.max(0, personIds.length - task.crew) : 0;
    const rate = asked.rates.find(({ gradeId }) => gradeId === task?.gradeId);
    if (further === 0 || !rate) continue;
    const days = new Set(spans.map(({ start_minutes }) => dayOfMinutes(start_minutes, asked.frame))).size;
    const hours = exactFigure(asked.setUp_hours).times(further * days);
    cost = cost.plus(exactMinor(rate.costPerHour, asked.digits).times(hours));
  }
  return roundMinor(cost);
}
