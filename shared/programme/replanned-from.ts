import { serialResult, type PlanHints } from '#shared/programme/serial-result';
import { networkPlan, type NetworkPlan } from '#shared/programme/improved-plan';
import type { HoldLengths } from '#shared/programme/place-room';
import { planBreaches } from '#shared/programme/plan-breaches';
import type { Programme } from '#shared/programme/programme-plan';
import { latestFirst, type RequestNetwork } from '#shared/programme/request-network';
import { standingPositions } from '#shared/programme/standing-positions';
import type { NetworkHold, Position } from '#shared/programme/task-network';

/** How long each hold lasted in an earlier plan. */
function holdLengths({ request, network }: RequestNetwork, { tasks }: Programme): HoldLengths {
  const before = new Map(tasks.map((task) => [task.taskId, task]));
  const lengths = new Map<NetworkHold, number>();
  for (const hold of network.places.flatMap(({ holds }) => holds)) {
    const [from, until] = [before.get(request.tasks[hold.from].id), before.get(request.tasks[hold.until].id)];
    if (from && until) lengths.set(hold, until.end_minutes - from.start_minutes);
  }
  return lengths;
}

/** A finish so much later is worth it that nobody's plan is shuffled. */
export const worth_minutes = 1440;

/** Who did each task, where the same people would do again. */
function samePeople({ request }: RequestNetwork, { tasks }: Programme): PlanHints['preferred'] {
  const people = new Map(tasks.map(({ taskId, personIds }) => [taskId, personIds]));
  const places = new Map(request.people.map(({ id }, at) => [id, at]));
  return request.tasks.map(({ id }) => people.get(id)?.map((one) => places.get(one) ?? -1) ?? null);
}

/** What stands of an earlier plan up to the first task that has to move; the rest follows in the order it had. */
function inOrder(ready: RequestNetwork, previous: Programme, standing: readonly (Position | null)[]) {
  const starts = new Map(previous.tasks.map((task) => [task.taskId, task.start_minutes]));
  const order = ready.request.tasks.map(({ id }, at) => starts.get(id) ?? ready.earliest.starts[at]);
  const first = Math.min(...order.filter((_, at) => standing[at] === null));
  return { order, standing: standing.map((position) => (position && position.start < first ? position : null)) };
}

/** A plan that moves little, and what has to stand if it is to end sooner by moving more: all up to the first move. */
export interface Replanned {
  readonly plan: NetworkPlan;
  readonly hints: PlanHints;
}

/**
 * An earlier plan with new places for what has to move: round all that may stand, or, where that ends more than a day later, with all that comes after the first
 * move put off in its old order. Null where neither comes to a plan.
 */
export function replannedFrom(ready: RequestNetwork, previous: Programme): Replanned | null {
  const lengths = holdLengths(ready, previous);
  const standing = standingPositions(ready, previous, lengths);
  const hints = { preferred: samePeople(ready, previous), lengths };
  const plan = (order: readonly number[], stands: readonly (Position | null)[]): NetworkPlan | null => {
    const { positions } = serialResult(ready, order, { ...hints, standing: stands });
    return positions && planBreaches(ready.network, positions).length === 0 ? networkPlan(positions) : null;
  };
  const quiet = plan(latestFirst(ready), standing);
  const later = inOrder(ready, previous, standing);
  const told = (chosen: NetworkPlan | null): Replanned | null =>
    chosen && { plan: chosen, hints: { ...hints, standing: later.standing } };
  if (quiet && quiet.finish <= (previous.finish_minutes ?? -Infinity)) return told(quiet);
  const shifted = plan(later.order, later.standing);
  const isWorth = quiet && shifted && shifted.finish < quiet.finish - worth_minutes;
  return told(isWorth ? shifted : (quiet ?? shifted));
}
