import { planBreaches, positionAt } from '#shared/programme/plan-breaches';
import type { HoldLengths } from '#shared/programme/place-room';
import type { PlannedTask, Programme } from '#shared/programme/programme-plan';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { Position, TaskNetwork } from '#shared/programme/task-network';

/** A request with its network. */
interface Planned {
  readonly request: ProgrammeRequest;
  readonly network: TaskNetwork;
}

function positionOf({ request, network }: Planned, task: number, before: PlannedTask | undefined): Position | null {
  if (!before) return null;
  const key = before.personIds.join(' ');
  const crew = network.tasks[task].crews.find(
    ({ people }) => people.map((one) => request.people[one].id).join(' ') === key,
  );
  return crew ? positionAt(network, { task, crew, start: before.start_minutes }) : null;
}

/** Where an earlier plan puts the tasks there still are, as far as the same people can be at them then. */
export function positionsOf(planned: Planned, plan: Programme): (Position | null)[] {
  const before = new Map(plan.tasks.map((task) => [task.taskId, task]));
  return planned.request.tasks.map(
    ({ id }, task) => planned.network.tasks[task].anchor ?? positionOf(planned, task, before.get(id)),
  );
}

/** Where an earlier plan puts tasks, without those that break something now: they and they alone have to move; `lengths` says how long each hold lasted. */
export function standingPositions(planned: Planned, plan: Programme, lengths: HoldLengths): (Position | null)[] {
  const positions = positionsOf(planned, plan);
  for (;;) {
    const breaches = planBreaches(planned.network, positions, lengths).filter(({ kind }) => kind !== 'hours');
    const moved = new Set(breaches.map(({ task }) => task).filter((task) => !planned.network.tasks[task].anchor));
    // Where what breaks something stands fast itself, the other side gives way.
    for (const breach of breaches) if (breach.kind === 'lag' && moved.size === 0) moved.add(breach.arc.from);
    for (const breach of breaches) if (breach.kind === 'people' && moved.size === 0) moved.add(breach.other);
    const movable = [...moved].filter((task) => positions[task] && !planned.network.tasks[task].anchor);
    if (movable.length === 0) return positions;
    for (const task of movable) positions[task] = null;
  }
}
