import { earliestTimes } from '#shared/programme/earliest-times';
import { clockProgress } from '#shared/programme/lag-progress';
import { lagShift } from '#shared/programme/lag-shift';
import { mirroredNetwork } from '#shared/programme/mirrored-network';
import { taskNetwork, type NetworkArc, type Position, type TaskNetwork } from '#shared/programme/task-network';

const atOnce = lagShift(clockProgress, 0);

const follows = (from: number, to: number): NetworkArc => ({
  from,
  fromPoint: 'end',
  to,
  toPoint: 'start',
  shift: atOnce,
  sourceId: '',
  side: 'least',
});

/** Each person's tasks one after another, as a plan has them. */
function personOrder({ people }: TaskNetwork, positions: readonly Position[]): NetworkArc[] {
  return Array.from({ length: people }, (_, person) => person).flatMap((person) => {
    const own = positions
      .flatMap((position, task) => (position.crew.people.includes(person) ? [{ task, ...position }] : []))
      .sort((a, b) => a.start - b.start || a.end - b.end || a.task - b.task);
    return own.slice(1).map(({ task }, before) => follows(own[before].task, task));
  });
}

/** Whoever leaves a place before another comes still does so. */
const placeOrder = ({ places }: TaskNetwork, positions: readonly Position[]): NetworkArc[] =>
  places.flatMap(({ holds }) =>
    holds.flatMap((one) =>
      holds.flatMap((other) => {
        const isAfter = one !== other && positions[one.until].end <= positions[other.from].start;
        return isAfter && one.until !== other.from ? [follows(one.until, other.from)] : [];
      }),
    ),
  );

/** The latest start of every task by which the whole still ends when the plan does, with the same people in the same order; minutes. */
export function latestStarts(network: TaskNetwork, positions: readonly Position[], finish: number): number[] {
  const tasks = network.tasks.map((task, at) => ({ ...task, crews: [positions[at].crew] }));
  const arcs = [...network.arcs, ...personOrder(network, positions), ...placeOrder(network, positions)];
  const { ends } = earliestTimes(mirroredNetwork(taskNetwork({ ...network, tasks, arcs }), finish));
  return ends.map((end, at) => Math.max(-end, positions[at].start));
}
