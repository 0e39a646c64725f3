import type { HoldLengths } from '#shared/programme/place-room';
import { SerialPlan, type PlanFailure } from '#shared/programme/serial-plan';
import type { TaskBlock } from '#shared/programme/task-blocks';
import type { Position, TaskNetwork } from '#shared/programme/task-network';

/** All tasks of a network in their places, or why there are none. */
export type SerialResult =
  | { readonly positions: readonly Position[]; readonly failure: null }
  | { readonly positions: null; readonly failure: PlanFailure };

/** A network with its blocks, by which it is planned again and again. */
export interface BlockedNetwork {
  readonly network: TaskNetwork;
  readonly blocks: readonly TaskBlock[];
}

/** Whom a plan takes again where others would do as well, and where some tasks stand from the start. */
export interface PlanHints {
  readonly preferred?: readonly (readonly number[] | null)[];
  readonly standing?: readonly (Position | null)[];
  readonly lengths?: HoldLengths;
}

const unknown: PlanFailure = { task: 0, arc: null, isHeld: false };

/** Blocks that still wait for their place, the most urgent first. */
interface Waiting {
  readonly blocks: readonly TaskBlock[];
  readonly isDone: boolean[];
  readonly queue: number[];
  readonly urgency: readonly number[];
  /** How often each had to give way. */
  readonly gaveWay: number[];
}

/** Two that want one place could send each other away for ever: who had to give way so often stays. */
const mostGivingWay = 10;

/** The plan in which blocks take their turn by the least priority of their tasks, each after those it waits for; as early as there is room. */
export function serialResult(
  { network, blocks }: BlockedNetwork,
  priorities: readonly number[],
  { preferred, standing = [], lengths }: PlanHints = {},
): SerialResult {
  const plan = new SerialPlan(network, preferred, lengths);
  standing.forEach((position, task) => position && !network.tasks[task].anchor && plan.put(task, position));
  const isDone = blocks.map(({ tasks }) => tasks.every((task) => plan.positions[task] !== null));
  const urgency = blocks.map(({ tasks }) => Math.min(...tasks.map((task) => priorities[task])));
  const waiting: Waiting = { blocks, isDone, urgency, queue: [], gaveWay: blocks.map(() => 0) };
  isDone.forEach((done, at) => !done && enqueue(waiting, at));
  while (waiting.queue.length > 0) {
    const place = nextPlaced(plan, waiting);
    if (place < 0) return { positions: null, failure: plan.failure ?? unknown };
    isDone[waiting.queue[place]] = true;
    waiting.queue.splice(place, 1);
  }
  return { positions: plan.positions.filter((position) => position !== null), failure: null };
}

/** The first in the queue that is ready and finds its place; one that finds none for another reason than a held place ends it, −1. */
function nextPlaced(plan: SerialPlan, waiting: Waiting): number {
  const { queue, blocks, isDone } = waiting;
  for (let place = 0; place < queue.length; place += 1) {
    const block = queue[place];
    if (!isReady(blocks[block], isDone)) continue;
    if (placed(plan, waiting, block)) return queue.indexOf(block);
    if (!plan.failure?.isHeld) return -1;
  }
  return -1;
}

const isReady = ({ before }: TaskBlock, isDone: readonly boolean[]): boolean => before.every((one) => isDone[one]);

function enqueue({ queue, urgency }: Waiting, block: number): void {
  const place = queue.findIndex((at) => urgency[at] > urgency[block] || (urgency[at] === urgency[block] && at > block));
  queue.splice(place < 0 ? queue.length : place, 0, block);
}

/** Places a block; what stands from an earlier plan and is in its way by a lag loses its place and waits again. */
function placed(plan: SerialPlan, waiting: Waiting, at: number): boolean {
  const { blocks, isDone, gaveWay } = waiting;
  for (const task of blocks[at].tasks) plan.lift(task);
  while (!plan.placeBlock(blocks[at])) {
    const inTheWay = plan.failure?.arc?.to ?? plan.failure?.holder;
    const other = blocks.findIndex(
      ({ tasks }, block) => block !== at && inTheWay !== undefined && tasks.includes(inTheWay),
    );
    if (other < 0 || !isDone[other] || gaveWay[other] === mostGivingWay) return false;
    gaveWay[other] += 1;
    for (const task of blocks[other].tasks) plan.lift(task);
    isDone[other] = false;
    enqueue(waiting, other);
  }
  return true;
}
