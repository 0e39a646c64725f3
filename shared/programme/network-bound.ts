import { earliestTimes, type EarliestTimes } from '#shared/programme/earliest-times';
import { mirroredNetwork } from '#shared/programme/mirrored-network';
import type { TaskNetwork } from '#shared/programme/task-network';

/** Work only certain people can do: its tasks, the person-minutes of each, and who they are. */
interface WorkPool {
  readonly tasks: readonly number[];
  readonly works: readonly number[];
  readonly people: readonly number[];
}

const ableTo = ({ tasks }: TaskNetwork, task: number): number[] =>
  [...new Set(tasks[task].crews.flatMap(({ people }) => people))].sort((a, b) => a - b);

/** For everybody who can do one task, all tasks that nobody else can do. */
function workPools(network: TaskNetwork): WorkPool[] {
  const able = network.tasks.map(({ anchor }, task) => (anchor ? [] : ableTo(network, task)));
  const groups = new Map(able.filter((people) => people.length > 0).map((people) => [people.join(), people]));
  return [...groups.values()].map((people) => {
    const tasks = network.tasks
      .map((_, at) => at)
      .filter((at) => able[at].length > 0 && able[at].every((one) => people.includes(one)));
    const works = tasks.map((at) =>
      Math.min(...network.tasks[at].crews.map(({ work, people: crew }) => work * crew.length)),
    );
    return { tasks, works, people };
  });
}

interface Windows {
  readonly starts: readonly number[];
  readonly ends: readonly number[];
}

/** More moments than these are not looked at as the start of a span: the bound is as true with fewer. */
const mostFroms = 60;

function thinned(moments: readonly number[]): number[] {
  const every = Math.max(1, Math.ceil(moments.length / mostFroms));
  return moments.filter((_, at) => at % every === 0);
}

/** Whether the people of a pool have the hours for all that has to be done inside every span. */
function hasHours(network: TaskNetwork, { tasks, works, people }: WorkPool, { starts, ends }: Windows): boolean {
  const spans = people.map(
    (person) =>
      network.tasks.flatMap(({ crews }) => crews).find((crew) => crew.people.join() === String(person))?.spans,
  );
  if (spans.some((one) => one === undefined)) return true;
  const hoursBy = (moment: number): number => spans.reduce((sum, one) => sum + (one?.workedBy(moment) ?? 0), 0);
  const order = tasks.map((_, at) => at).sort((a, b) => ends[tasks[a]] - ends[tasks[b]]);
  const by = order.map((at) => hoursBy(ends[tasks[at]]));
  const froms = thinned([...new Set(tasks.map((task) => starts[task]))].sort((a, b) => a - b));
  return froms.every((from) => {
    const before = hoursBy(from);
    let work = 0;
    return order.every((at, place) => {
      if (starts[tasks[at]] >= from) work += works[at];
      return work === 0 || work <= by[place] - before;
    });
  });
}

/** Whether nothing disproves that all of a network ends by a moment. */
function mayEndBy(
  network: TaskNetwork,
  finish: number,
  known: { readonly pools: readonly WorkPool[]; readonly earliest: EarliestTimes },
): boolean {
  const { starts, ends } = known.earliest;
  if (ends.some((end) => end > finish)) return false;
  const mirror = earliestTimes(mirroredNetwork(network, finish));
  if (mirror.failed) return false;
  const latest = { starts: mirror.ends.map((end) => -end), ends: mirror.starts.map((start) => -start) };
  if (network.tasks.some(({ anchor }, at) => !anchor && (latest.starts[at] < starts[at] || latest.ends[at] < ends[at])))
    return false;
  return known.pools.every((pool) => hasHours(network, pool, { starts, ends: latest.ends }));
}

/**
 * A moment before which no plan of a network ends, by lags and calendars and by the hours of those who alone can do the work; found by halving up to the
 * finish of a plan there is. Minutes.
 */
export function networkBound(network: TaskNetwork, earliest: EarliestTimes, finish: number): number {
  const known = { pools: workPools(network), earliest };
  let low = Math.max(0, ...earliest.ends);
  let high = Math.max(low, finish);
  while (low < high) {
    const middle = Math.floor((low + high) / 2);
    if (mayEndBy(network, middle, known)) high = middle;
    else low = middle + 1;
  }
  return low;
}
