import { isHeldByPin } from '#shared/programme/is-held-by-pin';
import { planBreaches } from '#shared/programme/plan-breaches';
import type { FirstResult } from '#shared/programme/request-network';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { Position, TaskNetwork } from '#shared/programme/task-network';
import type { Finding } from '#shared/words/finding';

/** What stops a request before anything is planned: tasks nobody can do, and pins where nobody works. */
export function requestRefusals(request: ProgrammeRequest, network: TaskNetwork): Finding[] {
  return request.tasks.flatMap((asked, at): Finding[] => {
    const { id: about, name: task, happened } = asked;
    const { crews, anchor } = network.tasks[at];
    if (anchor || happened) return [];
    if (crews.length === 0) return [{ kind: 'refuse', code: 'programme-too-few', values: { task }, about }];
    return isHeldByPin(asked, request)
      ? [{ kind: 'refuse', code: 'programme-pin-closed', values: { task }, about }]
      : [];
  });
}

/** Why a request has no plan: which step found no time, and because of which other. */
export function programmeFailure(request: ProgrammeRequest, { ready, result }: FirstResult): Finding {
  const failure = result.failure ?? { task: 0, arc: null, isHeld: false };
  const { name, id, isBreakable } = request.tasks[failure.task];
  if (!failure.arc) {
    const values = { task: name, isBreakable: isBreakable ? 'yes' : 'no' };
    return { kind: 'refuse', code: 'programme-no-hours', values, about: id };
  }
  const { from, to, side } = failure.arc;
  if (ready.network.tasks[to].anchor) {
    const pinned = request.tasks[to];
    return { kind: 'refuse', code: 'programme-pin-clash', values: { task: pinned.name }, about: pinned.id };
  }
  // A most lag leads back from its later task to its earlier one.
  const [first, next] =
    side === 'most' ? [request.tasks[to], request.tasks[from]] : [request.tasks[from], request.tasks[to]];
  return { kind: 'refuse', code: 'programme-no-time', values: { task: first.name, next: next.name }, about: first.id };
}

/** Windows that closed, or will have closed, before anybody can do what they wait for. */
export const missedWindows = (request: ProgrammeRequest, missed: ReadonlySet<string>): Finding[] =>
  request.lags
    .filter(({ id }) => missed.has(id))
    .map(({ fromTaskId, toTaskId }): Finding => {
      const name = (id: string): string => request.tasks.find((task) => task.id === id)?.name ?? id;
      const values = { task: name(fromTaskId), next: name(toTaskId) };
      return { kind: 'warn', code: 'programme-window-missed', values, about: toTaskId };
    });

/** Pins whose moment was over before anything was planned, of work nobody has begun. */
export const passedPins = (request: ProgrammeRequest): Finding[] =>
  request.tasks
    .filter((task) => task.pinned_minutes !== null && !task.happened && !isHeldByPin(task, request))
    .map(({ id: about, name: task }) => ({ kind: 'warn', code: 'programme-pin-passed', values: { task }, about }));

/** Pins that break a rule by themselves, whatever else moves. */
export function pinClashes(request: ProgrammeRequest, network: TaskNetwork, positions: readonly Position[]): Finding[] {
  const isPinned = (task: number): boolean => isHeldByPin(request.tasks[task], request);
  const about = planBreaches(network, positions).flatMap((breach) => {
    const concerned = breach.kind === 'lag' ? [breach.arc.to, breach.arc.from] : [breach.task];
    return concerned.find(isPinned) ?? [];
  });
  return [...new Set(about)].map((task) => {
    const { id, name } = request.tasks[task];
    return { kind: 'refuse', code: 'programme-pin-clash', values: { task: name }, about: id };
  });
}
