import { clockOf } from '#shared/programme/calendar-days';
import { firstPosition } from '#shared/programme/earliest-times';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { pointOf, type NetworkArc, type Position, type TaskNetwork } from '#shared/programme/task-network';
import type { Reason } from '#shared/words/reason';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** A plan with the request it answers. */
export interface PlanOfRequest {
  readonly request: ProgrammeRequest;
  readonly network: TaskNetwork;
  readonly positions: readonly Position[];
}

type Until = { readonly moment: number; readonly since: number };

function waits(plan: PlanOfRequest, code: WordCode, { moment, since, ...named }: Until & WordValues): Reason {
  const { day, time } = clockOf(moment, plan.request.calendar);
  const sameDay = clockOf(since, plan.request.calendar).day === day ? 'yes' : 'no';
  return { code, values: { ...named, until: time, day, sameDay }, figure: moment, unit: 'minutes' };
}

/** What has to lie before a task, by the latest moment it asks for. */
function lastArc({ network, positions }: PlanOfRequest, task: number): { arc: NetworkArc; moment: number } | null {
  let last: { arc: NetworkArc; moment: number } | null = null;
  for (const arc of network.arcsTo[task]) {
    if (arc.side !== 'least' || arc.toPoint !== 'start') continue;
    const moment = arc.shift.later(pointOf(positions[arc.from], arc.fromPoint));
    if (!last || moment > last.moment) last = { arc, moment };
  }
  return last;
}

function arcReason(plan: PlanOfRequest, { arc, moment }: { arc: NetworkArc; moment: number }): Reason {
  const since = pointOf(plan.positions[arc.from], arc.fromPoint);
  const approval = plan.request.approvals.find(({ id }) => id === arc.sourceId);
  if (approval) return waits(plan, 'programme-waits-approval', { approval: approval.name, moment, since });
  const values = { task: plan.request.tasks[arc.from].name, moment, since };
  return waits(plan, moment > since ? 'programme-waits-dry' : 'programme-waits-task', values);
}

/** The task its people were last at before they begin this one. */
function lastWork({ positions }: PlanOfRequest, task: number): number | null {
  const { crew, start } = positions[task];
  let last: number | null = null;
  positions.forEach((other, at) => {
    if (at === task || other.end > start || other.end <= other.busyFrom) return;
    if (!other.crew.people.some((person) => crew.people.includes(person))) return;
    if (last === null || other.end > positions[last].end) last = at;
  });
  return last;
}

/** The task whose window or limit keeps this one from starting earlier: they are put where both find room. */
function tiedTo({ network, positions }: PlanOfRequest, task: number): number | null {
  const tied = network.arcsTo[task].find(
    (arc) =>
      arc.side === 'most' &&
      arc.shift.later(pointOf(positions[arc.from], arc.fromPoint)) === pointOf(positions[task], arc.toPoint),
  );
  return tied ? tied.from : (network.arcsTo[task].find((arc) => arc.side === 'most')?.from ?? null);
}

/** From when on nothing but people, hours and windows keeps a task. */
function readiness(plan: PlanOfRequest, task: number): { readonly ready: number; readonly reasons: Reason[] } {
  const { request, network } = plan;
  const release = network.tasks[task].release;
  const last = lastArc(plan, task);
  if (last && last.moment >= release) return { ready: last.moment, reasons: [arcReason(plan, last)] };
  const since = request.start_minutes;
  if (release <= since) return { ready: release, reasons: [] };
  const approval = request.approvals.find(({ beforeTaskId }) => beforeTaskId === request.tasks[task].id);
  const moment = { moment: release, since };
  const reason = approval
    ? waits(plan, 'programme-waits-approval', { approval: approval.name, ...moment })
    : waits(plan, 'programme-waits-release', moment);
  return { ready: release, reasons: [reason] };
}

function placeReason(plan: PlanOfRequest, task: number): Reason[] {
  const { network, positions, request } = plan;
  const { start } = positions[task];
  return network.places.flatMap(({ holds }, at) => {
    const isWanted = holds.some(({ from }) => from === task);
    const isFreed = holds.some(({ until, from }) => from !== task && positions[until].end === start);
    const values = { place: request.places[at].name, moment: start, since: start };
    return isWanted && isFreed ? [waits(plan, 'programme-waits-place', values)] : [];
  });
}

/** Why a task does not start earlier than it does: what it waited for last, then hands, room, working hours, or a window that follows. */
export function taskWaits(plan: PlanOfRequest, task: number): Reason[] {
  const { network, positions, request } = plan;
  const { start, crew } = positions[task];
  if (request.tasks[task].happened) return [];
  if (network.tasks[task].anchor) return [waits(plan, 'programme-waits-pinned', { moment: start, since: start })];
  const { ready, reasons } = readiness(plan, task);
  if (start <= ready) return reasons;
  const work = lastWork(plan, task);
  const free = work === null ? -Infinity : positions[work].end;
  if (work !== null && free > ready)
    reasons.push(waits(plan, 'programme-waits-people', { task: request.tasks[work].name, moment: free, since: ready }));
  const from = Math.max(ready, free);
  reasons.push(...placeReason(plan, task));
  const first = firstPosition(network.tasks[task], crew, { start: from, end: -Infinity })?.start ?? from;
  if (first > from) reasons.push(waits(plan, 'programme-waits-hours', { moment: first, since: from }));
  const tied = start > first ? tiedTo(plan, task) : null;
  if (tied !== null)
    reasons.push(
      waits(plan, 'programme-waits-window', { task: request.tasks[tied].name, moment: start, since: start }),
    );
  return reasons;
}
