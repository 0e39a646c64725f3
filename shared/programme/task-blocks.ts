import type { TaskNetwork } from '#shared/programme/task-network';

/** Tasks that most lags tie together, so that they find their places together; blocks that have to stand before it. */
export interface TaskBlock {
  readonly tasks: readonly number[];
  readonly before: readonly number[];
}

/** The tasks that arcs lead to from a task that may still move. */
const onward = ({ tasks, arcsFrom }: TaskNetwork, task: number): number[] =>
  arcsFrom[task].map((arc) => arc.to).filter((to) => tasks[to].anchor === null);

/** Strongly connected tasks in the order of the first of each (Tarjan 1972, without recursion so that long chains do no harm). */
function connected(network: TaskNetwork): number[][] {
  const count = network.tasks.length;
  const [index, low] = [new Int32Array(count).fill(-1), new Int32Array(count)];
  const isOpen = new Array<boolean>(count).fill(false);
  const [path, found]: [number[], number[][]] = [[], []];
  let next = 0;
  const open = (task: number) => {
    index[task] = low[task] = next;
    next += 1;
    path.push(task);
    isOpen[task] = true;
    return { task, left: onward(network, task) };
  };
  const close = (task: number): void => {
    if (low[task] !== index[task]) return;
    const set = path.splice(path.indexOf(task));
    for (const one of set) isOpen[one] = false;
    found.push(set.sort((a, b) => a - b));
  };
  const visit = (from: number): void => {
    const stack = [open(from)];
    for (let top = stack.at(-1); top; top = stack.at(-1)) {
      const to = top.left.pop();
      if (to === undefined) {
        close(top.task);
        stack.pop();
        const above = stack.at(-1)?.task;
        if (above !== undefined) low[above] = Math.min(low[above], low[top.task]);
      } else if (index[to] < 0) stack.push(open(to));
      else if (isOpen[to]) low[top.task] = Math.min(low[top.task], index[to]);
    }
  };
  network.tasks.forEach((task, at) => {
    if (index[at] < 0 && task.anchor === null) visit(at);
  });
  return found.sort(([a], [b]) => a - b);
}

/** The tasks of a network that may move in blocks, with those each waits for; inside a block in the order of the earliest times given. */
export function taskBlocks(network: TaskNetwork, earliest: readonly number[]): TaskBlock[] {
  const sets = connected(network);
  const blockOf = new Map(sets.flatMap((set, block) => set.map((task) => [task, block] as const)));
  return sets.map((set, block) => {
    const before = set.flatMap((task) => network.arcsTo[task].map((arc) => blockOf.get(arc.from)));
    return {
      tasks: [...set].sort((a, b) => earliest[a] - earliest[b] || a - b),
      before: [...new Set(before.filter((one) => one !== undefined && one !== block))],
    } as TaskBlock;
  });
}
