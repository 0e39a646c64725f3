import { seededGenerator, type Generator32 } from '#shared/estimates/risk/seeded-generator';
import { serialResult, type BlockedNetwork, type PlanHints } from '#shared/programme/serial-result';
import { holdLengthsOf, isRoomPromised } from '#shared/programme/hold-lengths-of';
import { mirroredNetwork } from '#shared/programme/mirrored-network';
import { planBreaches } from '#shared/programme/plan-breaches';
import type { SearchLimit } from '#shared/programme/project';
import { taskBlocks } from '#shared/programme/task-blocks';
import { earliestTimes } from '#shared/programme/earliest-times';
import type { Position, TaskNetwork } from '#shared/programme/task-network';

/** A plan in places of a network, with the moment all of it is done. */
export interface NetworkPlan {
  readonly positions: readonly Position[];
  readonly finish: number;
}

/** A plan of its positions. */
export const networkPlan = (positions: readonly Position[]): NetworkPlan => ({
  positions,
  finish: positions.reduce((finish, { end }) => Math.max(finish, end), -Infinity),
});

/** What improving is given: where to begin, when there is nothing more to gain, when to stop, and whom to tell. */
export interface Improving {
  readonly first: NetworkPlan;
  readonly bound: number;
  readonly limit: SearchLimit;
  readonly seed: number;
  /** The lot of each task. */
  readonly lots: readonly string[];
  readonly onBetter: (plan: NetworkPlan) => void;
  /** What stands all the same. */
  readonly hints?: PlanHints;
}

/** Tries without a limit of the asker's. */
const usualTries = 60;

/** Sum of all ends: of two plans that finish together the one with less lying about is better. */
const lateness = ({ positions }: NetworkPlan): number => positions.reduce((sum, { end }) => sum + end, 0);

const isBetter = (one: NetworkPlan, other: NetworkPlan): boolean =>
  one.finish < other.finish || (one.finish === other.finish && lateness(one) < lateness(other));

/** The blocks of a network seen backward; their order inside hardly depends on the finish, so they are found once. */
function blocksBackward({ network }: BlockedNetwork, finish: number): BlockedNetwork['blocks'] {
  const mirror = mirroredNetwork(network, finish);
  return taskBlocks(mirror, earliestTimes(mirror).starts);
}

/** Where room is promised elsewhere, how long each hold lasts in a plan: without it nothing would fit in before the last promise. */
export const roomHints = (network: TaskNetwork, positions: readonly Pick<Position, 'start' | 'end'>[]): PlanHints =>
  isRoomPromised(network) ? { lengths: holdLengthsOf(network, positions) } : {};

/** A plan in an order, holds as long as in the plan before it; null where there is none that keeps every rule. */
function replanned(blocked: BlockedNetwork, order: readonly number[], hints: PlanHints): readonly Position[] | null {
  const { positions } = serialResult(blocked, order, hints);
  // Lengths are guesses, so what is planned by them is looked at again.
  return positions && hints.lengths && planBreaches(blocked.network, positions).length > 0 ? null : positions;
}

/** The order in which a plan stands when everything is put off as far as its finish allows (double justification of Valls, Ballestín, Quintanilla 2005, from memory). */
function justified(
  { network }: BlockedNetwork,
  blocks: BlockedNetwork['blocks'],
  plan: NetworkPlan,
): readonly number[] | null {
  const mirror = mirroredNetwork(network, plan.finish);
  const seenBack = plan.positions.map(({ start, end }) => ({ start: -end, end: -start }));
  const { positions } = serialResult(
    { network: mirror, blocks },
    seenBack.map(({ start }) => start),
    roomHints(mirror, seenBack),
  );
  return positions && positions.map(({ end }) => -end);
}

/** The starts of a plan shaken, each by itself or those of one lot together. */
function shaken(
  plan: NetworkPlan,
  { share, lots }: { readonly share: number; readonly lots: readonly string[] | null },
  next: Generator32,
): number[] {
  const [first, span] = [Math.min(...plan.positions.map(({ start }) => start)), plan.finish];
  const spread = Math.max(1, span - first) * share;
  const draw = (): number => (spread * next()) / 2 ** 32;
  const byLot = new Map([...new Set(lots ?? [])].map((lot) => [lot, draw()]));
  return plan.positions.map(({ start }, at) => start + (byLot.get(lots?.[at] ?? '') ?? draw()));
}

/** How far priorities are shaken, in parts of the whole time, one try after another. */
const shares = [0.02, 0.05, 0.1, 0.01, 0.2];

/**
 * Better and better plans: each is justified to the right and planned again, or its order is shaken by a seed; until the bound is reached or the limit says
 * so. The number of plans tried and the best.
 */
export function improvedPlan(
  blocked: BlockedNetwork,
  improving: Improving,
): { readonly plan: NetworkPlan; readonly plans: number } {
  const { bound, limit, onBetter } = improving;
  const next = seededGenerator(improving.seed);
  const most = limit.nodes ?? (limit.shouldStop ? Infinity : usualTries);
  let best = improving.first;
  let current = best;
  let plans = 0;
  const backward = blocksBackward(blocked, best.finish);
  let isSettled = false;
  while (best.finish > bound && plans < most && !limit.shouldStop?.()) {
    plans += 1;
    const order = isSettled ? null : justified(blocked, backward, current);
    const shake = { share: shares[plans % shares.length], lots: plans % 2 === 0 ? improving.lots : null };
    const hints = { ...roomHints(blocked.network, current.positions), ...improving.hints };
    const positions = replanned(blocked, order ?? shaken(best, shake, next), hints);
    isSettled = !positions;
    if (!positions) continue;
    const plan = networkPlan(positions);
    isSettled = order !== null && !isBetter(plan, current);
    current = plan;
    if (!isBetter(plan, best)) continue;
    if (plan.finish < best.finish) onBetter(plan);
    best = plan;
  }
  return { plan: best, plans };
}
