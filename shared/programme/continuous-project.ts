import { isProjectPlan } from '#shared/programme/project-starts';
import type { Project, ProjectLag } from '#shared/programme/project';
import type { ProgrammeLag, ProgrammeRequest } from '#shared/programme/programme-request';
import type { Crew, Position, TaskNetwork } from '#shared/programme/task-network';

/** More tasks than these are no matter for a search that proves the best. */
const mostActivities = 40;

/** Who can do a task, as one text; people who can do the same are one resource. */
const poolOf = ({ crews }: TaskNetwork['tasks'][number]): string =>
  [...new Set(crews.flatMap(({ people }) => people))].sort((a, b) => a - b).join();

const sizeOf = (pool: string): number => (pool === '' ? 0 : pool.split(',').length);

/** Whether pools have nobody in common unless they are one. */
const areApart = (pools: readonly string[]): boolean => {
  const people = pools.flatMap((pool) => (pool === '' ? [] : pool.split(',')));
  return new Set(people).size === people.length;
};

/** Whether a task lasts the same whoever does it and is done without a stop whenever it starts. */
function isUnit({ crews, anchor }: TaskNetwork['tasks'][number], start: number): boolean {
  const [first] = crews;
  const neverStops = ({ spans, people }: Crew): boolean =>
    people.length === 0 || (spans.spans.length === 1 && spans.spans[0].start_minutes <= start);
  return (
    !anchor &&
    crews.length > 0 &&
    crews.every((crew) => crew.work === first.work && crew.people.length === first.people.length && neverStops(crew))
  );
}

/** Start to start: what runs from or to an end is put off by what lasts always the same. */
function projectLags(
  lag: ProgrammeLag,
  at: { readonly from: number; readonly to: number },
  durations: readonly number[],
): ProjectLag[] {
  const shift = (lag.fromPoint === 'end' ? durations[at.from] : 0) - (lag.toPoint === 'end' ? durations[at.to] : 0);
  const least: ProjectLag = { ...at, least: lag.least + shift };
  return lag.most === null ? [least] : [least, { from: at.to, to: at.from, least: -lag.most - shift }];
}

const isPlain = (request: ProgrammeRequest): boolean =>
  request.tasks.length <= mostActivities &&
  request.approvals.every(({ afterTaskId }) => afterTaskId === null) &&
  request.lags.every(({ time, paceId }) => time === 'clock' && paceId === null) &&
  request.placeHolds.every(({ fromTaskId, untilTaskId }) => fromTaskId === untilTaskId) &&
  request.places.every(({ taken }) => taken.length === 0);

/**
 * A request as the published problem, with starts counted from its first moment, where it is one: work never stops, people who can do the same can do
 * nothing else, nobody shares, nothing stands fast. Null where it is not. Minutes.
 */
export function continuousProject(request: ProgrammeRequest, network: TaskNetwork): Project | null {
  const pools = [...new Set(network.tasks.map(poolOf))];
  if (!isPlain(request) || !areApart(pools)) return null;
  if (!network.tasks.every((task) => isUnit(task, request.start_minutes))) return null;
  const durations = network.tasks.map(({ crews }) => crews[0].work);
  const places = new Map(request.tasks.map(({ id }, at) => [id, at]));
  const at = (id: string): number => places.get(id) ?? 0;
  const demandsOf = (task: number): number[] => [
    ...pools.map((pool) => (poolOf(network.tasks[task]) === pool ? network.tasks[task].crews[0].people.length : 0)),
    ...network.places.map(({ holds }) =>
      holds.filter(({ from }) => from === task).reduce((sum, { amount }) => sum + amount, 0),
    ),
  ];
  return {
    activities: durations.map((duration, task) => ({
      duration,
      demands: demandsOf(task),
      release: network.tasks[task].release - request.start_minutes,
    })),
    lags: request.lags.flatMap((lag) =>
      projectLags(lag, { from: at(lag.fromTaskId), to: at(lag.toTaskId) }, durations),
    ),
    capacities: [...pools.map(sizeOf), ...network.places.map(({ capacity }) => capacity)],
  };
}

/** Starts of the project as positions of the request's tasks: whoever of those who can is free first takes the next; none where starts break the project. */
export function positionsOfStarts(
  network: TaskNetwork,
  project: Project,
  at: { readonly starts: readonly number[]; readonly from_minutes: number },
): readonly Position[] | null {
  if (!isProjectPlan(at.starts, project)) return null;
  const freeFrom = new Array<number>(network.people).fill(-Infinity);
  const positions = new Array<Position>(network.tasks.length);
  const order = at.starts.map((_, task) => task).sort((a, b) => at.starts[a] - at.starts[b] || a - b);
  for (const task of order) {
    const start = at.from_minutes + at.starts[task];
    const crew = network.tasks[task].crews.find(({ people }) => people.every((person) => freeFrom[person] <= start));
    if (!crew) return null;
    const end = start + crew.work;
    for (const person of crew.people) freeFrom[person] = Math.max(freeFrom[person], end);
    positions[task] = { start, end, busyFrom: start, crew };
  }
  return positions;
}
