import type { NetworkPlan } from '#shared/programme/improved-plan';
import { plannedTasks } from '#shared/programme/planned-tasks';
import type { Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { ProjectStatus } from '#shared/programme/project';
import type { RequestNetwork } from '#shared/programme/request-network';
import type { Finding } from '#shared/words/finding';

/** A request without a plan, and why. */
export const noPlan = (request: ProgrammeRequest, status: ProjectStatus, findings: readonly Finding[]): Programme => ({
  status,
  tasks: [],
  from_minutes: request.start_minutes,
  start_minutes: request.start_minutes,
  finish_minutes: null,
  lowerBound_minutes: request.start_minutes,
  gap: null,
  plans: 0,
  findings,
  cycle: [],
});

/** What is known of a plan beside its positions: the moment before which none ends, and how many were tried. */
export interface PlanKnown {
  readonly bound: number;
  readonly plans: number;
}

/** A plan as it is told, with its distance to the bound in parts of the time from the first moment to the bound; minutes. */
export function describedProgramme(
  { request, network }: RequestNetwork,
  { positions, finish }: NetworkPlan,
  { bound, plans }: PlanKnown,
): Programme {
  const whole = bound - request.start_minutes;
  return {
    status: finish <= bound ? 'optimal' : 'feasible',
    tasks: plannedTasks({ request, network, positions }, finish),
    from_minutes: request.start_minutes,
    start_minutes: Math.min(...positions.map(({ start }) => start), finish),
    finish_minutes: finish,
    lowerBound_minutes: Math.min(bound, finish),
    gap: finish <= bound || whole <= 0 ? 0 : (finish - bound) / whole,
    plans,
    findings: [],
    cycle: [],
  };
}
