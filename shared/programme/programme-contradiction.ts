import { contradictingLags } from '#shared/programme/contradicting-lags';
import type { Project, ProjectLag } from '#shared/programme/project';
import type { ProgrammeLag, ProgrammeRequest, TaskPoint } from '#shared/programme/programme-request';
import type { TaskNetwork } from '#shared/programme/task-network';
import type { Finding } from '#shared/words/finding';

/** Lags that contradict each other whatever the hours, by their ids, and what to say of them. */
export interface ProgrammeContradiction {
  readonly lagIds: readonly string[];
  readonly finding: Finding;
}

interface NamedLag extends ProjectLag {
  readonly lagId: string | null;
}

const point = (task: number, at: TaskPoint): number => task * 2 + (at === 'start' ? 0 : 1);

/** The least factor of a pace, so that nothing takes longer here than it does. */
function leastFactor({ paces }: ProgrammeRequest, { paceId }: ProgrammeLag, side: 'least' | 'most'): number {
  const factors = paces.find(({ id }) => id === paceId)?.stretches.map(({ factor }) => factor) ?? [1];
  return side === 'least' ? Math.min(...factors) : Math.max(...factors);
}

/** Both sides of a lag between the points of its tasks, never tighter than it is; lags of working time are not looked at here. */
function lagSides(request: ProgrammeRequest, lag: ProgrammeLag, placeOf: (id: string) => number): NamedLag[] {
  const [from, to] = [point(placeOf(lag.fromTaskId), lag.fromPoint), point(placeOf(lag.toTaskId), lag.toPoint)];
  if (lag.time !== 'clock') return lag.least < 0 ? [] : [{ from, to, least: 0, lagId: lag.id }];
  const least = Math.floor(lag.least * leastFactor(request, lag, 'least'));
  const sides: NamedLag[] = [{ from, to, least, lagId: lag.id }];
  if (lag.most === null) return sides;
  return [
    ...sides,
    { from: to, to: from, least: -Math.ceil(lag.most * leastFactor(request, lag, 'most')), lagId: lag.id },
  ];
}

/** The time a task takes at the least; where people never stop and one crew alone can do it, exactly that. */
function taskSides({ tasks }: TaskNetwork, task: number): NamedLag[] {
  const { crews, anchor } = tasks[task];
  if (anchor || crews.length === 0) return [];
  const works = crews.map(({ work }) => work);
  const [least, most] = [Math.min(...works), Math.max(...works)];
  const sides: NamedLag[] = [{ from: point(task, 'start'), to: point(task, 'end'), least, lagId: null }];
  const neverStops = crews.every(({ spans, work }) => work === 0 || spans.spans.length === 1);
  return neverStops
    ? [...sides, { from: point(task, 'end'), to: point(task, 'start'), least: -most, lagId: null }]
    : sides;
}

/** The lags of a request that contradict each other by the clock alone, in words; null where there are none. */
export function programmeContradiction(request: ProgrammeRequest, network: TaskNetwork): ProgrammeContradiction | null {
  const places = new Map(request.tasks.map(({ id }, at) => [id, at]));
  const placeOf = (id: string): number => places.get(id) ?? 0;
  const lags = [
    ...request.lags.flatMap((lag) => lagSides(request, lag, placeOf)),
    ...request.tasks.flatMap((_, task) => taskSides(network, task)),
  ].filter(({ from, to }) => !network.tasks[from >> 1].anchor && !network.tasks[to >> 1].anchor);
  const project: Project = { activities: request.tasks.flatMap(() => [instant, instant]), lags, capacities: [] };
  const cycle = contradictingLags(project) as readonly NamedLag[];
  if (cycle.length === 0) return null;
  const names = [...new Set(cycle.map(({ from }) => request.tasks[from >> 1].name))];
  const over_minutes = cycle.reduce((sum, { least }) => sum + least, 0);
  const about = request.tasks[cycle[0].from >> 1].id;
  return {
    lagIds: [...new Set(cycle.flatMap(({ lagId }) => lagId ?? []))],
    finding: {
      kind: 'refuse',
      code: 'programme-contradiction',
      values: { tasks: names.join(' → '), over_minutes },
      about,
    },
  };
}

const instant = { duration: 0, demands: [] };
