import type { FirstResult } from '#shared/programme/request-network';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { TaskNetwork } from '#shared/programme/task-network';
import type { Finding } from '#shared/words/finding';

/** What stops a request before anything is planned: tasks nobody can do, and pins where nobody works. */
export function requestRefusals(request: ProgrammeRequest, network: TaskNetwork): Finding[] {
  return request.tasks.flatMap(({ id: about, name: task, pinned_minutes, happened }, at): Finding[] => {
    const { crews, anchor } = network.tasks[at];
    if (anchor || happened) return [];
    if (crews.length === 0) return [{ kind: 'refuse', code: 'programme-too-few', values: { task }, about }];
    return pinned_minutes === null ? [] : [{ kind: 'refuse', code: 'programme-pin-closed', values: { task }, about }];
  });
}

/** Why a request has no plan: which step found no time, and because of which other. */
export function failureFinding(request: ProgrammeRequest, { ready, result }: FirstResult): Finding {
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
