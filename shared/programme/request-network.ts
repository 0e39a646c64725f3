import { serialResult, type BlockedNetwork, type SerialResult } from '#shared/programme/serial-result';
import { earliestTimes, type EarliestTimes } from '#shared/programme/earliest-times';
import { networkPlan } from '#shared/programme/improved-plan';
import { holdLengthsOf, isRoomPromised } from '#shared/programme/hold-lengths-of';
import { mirroredNetwork } from '#shared/programme/mirrored-network';
import { daysUntil, networkOf } from '#shared/programme/network-of';
import { planBreaches } from '#shared/programme/plan-breaches';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import { taskBlocks } from '#shared/programme/task-blocks';
import { taskNetwork, type NetworkArc, type TaskNetwork } from '#shared/programme/task-network';

/** A request ready to be planned, with its earliest times by lags and calendars alone. */
export interface RequestNetwork extends BlockedNetwork {
  readonly request: ProgrammeRequest;
  readonly earliest: EarliestTimes;
}

/** No plan of a workshop reaches further than some thirty years. */
const mostDays = 12_000;

const blocked = (network: TaskNetwork, earliest: EarliestTimes): BlockedNetwork => ({
  network,
  blocks: taskBlocks(network, earliest.starts),
});

/** A request over the days its network has. */
function over(request: ProgrammeRequest, network: TaskNetwork): RequestNetwork {
  const earliest = earliestTimes(network);
  return { request, earliest, ...blocked(network, earliest) };
}

/** How early blocks should have their turn: by the latest starts at which a job as long as its lags still ends in time. */
export function latestFirst({ network, earliest }: RequestNetwork): number[] {
  const finish = Math.max(0, ...earliest.ends);
  return earliestTimes(mirroredNetwork(network, finish)).ends.map((end) => -end);
}

/**
 * Orders worth trying first: by latest start, by earliest start, and lot after lot, each later by a share of the time all of them take, so that those who
 * are busiest always have the next lot before them.
 */
function firstOrders(ready: RequestNetwork): number[][] {
  const { request, earliest } = ready;
  const late = latestFirst(ready);
  const lots = [...new Set(request.tasks.map(({ lotId }) => lotId))];
  const rank = new Map(lots.map((lot, at) => [lot, at]));
  const works = ready.network.tasks.map(({ crews }) => Math.min(...crews.map(({ work }) => work)));
  const beat = works.reduce((sum, work) => sum + work, 0) / lots.length;
  const staggered = beats.map((share) =>
    late.map((start, at) => start + share * beat * (rank.get(request.tasks[at].lotId) ?? 0)),
  );
  const orders = [late, [...earliest.starts], ...staggered];
  const pressed = pressedTasks(ready.network);
  if (pressed.size === 0) return orders;
  return [late, ...orders.map((order) => order.map((priority, at) => (pressed.has(at) ? priority - ahead : priority)))];
}

/** More than any priority, so that what is pressed comes before all else. */
const ahead = 1e9;

/** Tasks that have to be in time for one that stands fast, by a window it opened or since it is pinned, with all they wait for. */
function pressedTasks({ tasks, arcsFrom, arcsTo }: TaskNetwork): ReadonlySet<number> {
  const pressed = new Set(
    tasks.flatMap(({ anchor }, at) => (!anchor && arcsFrom[at].some(({ to }) => tasks[to].anchor) ? [at] : [])),
  );
  for (const task of pressed) for (const { from } of arcsTo[task]) if (!tasks[from].anchor) pressed.add(from);
  return pressed;
}

/** By how much a lot follows the one before it, in parts of the hands-on work of a lot. */
const beats = [0.25, 1, 4];

/** The first plan of a request, or why there is none. */
export interface FirstResult {
  readonly ready: RequestNetwork;
  readonly result: SerialResult;
  /** The lag that leads beyond all hours there are, whoever else needs them. */
  readonly endless: NetworkArc | null;
}

const finish = ({ positions }: SerialResult): number => (positions ? networkPlan(positions).finish : Infinity);

/** The best of the first orders, or the first of them that comes to a plan, where all that is asked is whether there is one. */
function orderedResult(ready: RequestNetwork, asked: 'best' | 'any'): SerialResult {
  let best: SerialResult | null = null;
  for (const order of firstOrders(ready)) {
    const result = serialResult(ready, order);
    if (!best || finish(result) < finish(best)) best = result;
    if (asked === 'any' && best.positions) break;
  }
  if (!best) throw new RangeError('there is always an order to begin with');
  return best;
}

const withoutPromises = (network: TaskNetwork): TaskNetwork =>
  taskNetwork({ ...network, places: network.places.map((place) => ({ ...place, taken: [] })) });

/**
 * A plan between what rooms are promised for elsewhere: it is planned as though nothing were, which tells how long each hold lasts, and then again in that
 * order. Null where that comes to no plan.
 */
function resultBetweenPromises(ready: RequestNetwork, asked: 'best' | 'any'): SerialResult | null {
  const network = withoutPromises(ready.network);
  const { positions } = orderedResult({ ...ready, network }, asked);
  if (!positions) return null;
  const order = positions.map(({ start }) => start);
  const result = serialResult(ready, order, { lengths: holdLengthsOf(network, positions) });
  return result.positions && planBreaches(ready.network, result.positions).length === 0 ? result : null;
}

function bestResult(ready: RequestNetwork, asked: 'best' | 'any'): SerialResult {
  const ordered = orderedResult(ready, asked);
  if (!isRoomPromised(ready.network) || (asked === 'any' && ordered.positions)) return ordered;
  const between = resultBetweenPromises(ready, asked);
  return between && finish(between) < finish(ordered) ? between : ordered;
}

function firstOver(ready: RequestNetwork, asked: 'best' | 'any'): FirstResult {
  if (ready.earliest.failed) {
    const { failed } = ready.earliest;
    return {
      ready,
      endless: failed,
      result: { positions: null, failure: { task: failed.to, arc: failed, isHeld: false } },
    };
  }
  return { ready, result: bestResult(ready, asked), endless: null };
}

/** How far a calendar is needed at the least, and whether any plan will do. */
export interface FirstAsked {
  readonly until_minutes: number;
  readonly result: 'best' | 'any';
}

/** A network over as many days of the calendar as it takes to plan it: those it has, and twice as many each time the hours run out. */
function firstOverDays(request: ProgrammeRequest, asked: FirstAsked, missed: ReadonlySet<string>): FirstResult {
  for (let days = daysUntil(request, asked.until_minutes); ; days *= 2) {
    const found = firstOver(over(request, networkOf(request, days, missed).network), asked.result);
    const { failure } = found.result;
    const isOutOfHours = failure !== null && (failure.arc === null || found.ready.earliest.ends.includes(Infinity));
    if (!isOutOfHours || days * 2 > mostDays) return found;
  }
}

/** A first plan of a request; windows of what has happened that can be kept no more are left out and named, by the ids of their lags. */
export function firstResult(
  request: ProgrammeRequest,
  asked: FirstAsked,
): FirstResult & { readonly missed: ReadonlySet<string> } {
  const missed = new Set<string>();
  for (;;) {
    const found = firstOverDays(request, asked, missed);
    const arc = found.result.failure?.arc;
    if (arc?.side !== 'most' || !request.tasks[arc.to].happened || missed.has(arc.sourceId))
      return { ...found, missed };
    missed.add(arc.sourceId);
  }
}
