import { mirroredShift } from '#shared/programme/lag-shift';
import type { TaskPoint } from '#shared/programme/programme-request';
import {
  taskNetwork,
  type Crew,
  type NetworkArc,
  type NetworkTask,
  type Position,
  type TaskNetwork,
} from '#shared/programme/task-network';
import type { WorkingSpans } from '#shared/programme/working-spans';

const otherPoint = (point: TaskPoint): TaskPoint => (point === 'start' ? 'end' : 'start');

const mirroredArc = ({ from, fromPoint, to, toPoint, shift, sourceId, side }: NetworkArc): NetworkArc => ({
  from: to,
  fromPoint: otherPoint(toPoint),
  to: from,
  toPoint: otherPoint(fromPoint),
  shift: mirroredShift(shift),
  sourceId,
  side,
});

/** Where a task stands, seen backward with a crew of the other view. */
export const mirroredPosition = ({ start, end }: Position, crew: Crew): Position => ({
  start: -end,
  end: -start,
  busyFrom: -end,
  crew,
});

/** A network seen backward in time with the crews of each task in the same order: what is early there is late here. */
function mirrorOf(network: TaskNetwork): TaskNetwork {
  const known = new Map<WorkingSpans, WorkingSpans>();
  const mirrored = (spans: WorkingSpans): WorkingSpans => {
    const made = known.get(spans) ?? spans.mirrored();
    known.set(spans, made);
    return made;
  };
  const crewOf = (crew: Crew): Crew => ({ ...crew, spans: mirrored(crew.spans) });
  const tasks = network.tasks.map((task): NetworkTask => ({
    crews: task.crews.map(crewOf),
    isBreakable: task.isBreakable,
    release: -Infinity,
    anchor: task.anchor && mirroredPosition(task.anchor, crewOf(task.anchor.crew)),
  }));
  const places = network.places.map(({ capacity, taken, holds }) => ({
    capacity,
    taken: taken.map(({ start, end, amount }) => ({ start: -end, end: -start, amount })),
    holds: holds.map(({ from, until, amount }) => ({ from: until, until: from, amount })),
  }));
  return taskNetwork({ tasks, arcs: network.arcs.map(mirroredArc), places, people: network.people });
}

/** What was turned round once is not turned round again for another finish. */
const mirrors = new WeakMap<TaskNetwork, TaskNetwork>();

/** A network seen backward in time, everything done by a moment. */
export function mirroredNetwork(network: TaskNetwork, finish: number): TaskNetwork {
  const mirror = mirrors.get(network) ?? mirrorOf(network);
  mirrors.set(network, mirror);
  return { ...mirror, tasks: mirror.tasks.map((task) => ({ ...task, release: -finish })) };
}
