import type { ImprovedStarts } from '#shared/programme/improved-starts';
import { keepsTimetable, usageOf, type Usage } from '#shared/programme/keeps-timetable';
import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project, ProjectStarts, SearchLimit } from '#shared/programme/project';
import { keepsApart, pairsApart, type ApartPair } from '#shared/programme/keeps-apart';
import { keepsLoads, usageLoads, type UsageLoad } from '#shared/programme/usage-loads';
import { projectStarts } from '#shared/programme/project-starts';
import { cheapestOrder, type ConflictChoice, usageConflict } from '#shared/programme/usage-conflict';

/** Nodes of the first turn. */
const firstTurn_nodes = 1000;

/**
 * Depth-first branch and bound over the order of activities that clash: at the first moment at which earliest starts ask too much, two of those at work
 * are chosen, and either one ends before the other starts or it does not, which is a lag as well. The relaxation is that of De Reyck and Herroelen (1998),
 * the two-way branching our own; both from memory.
 */
export class OrderSearch {
  nodes = 0;
  isStopped = false;
  private readonly pairs: readonly ApartPair[];
  private readonly loads: UsageLoad[];
  private readonly usage: Usage;

  constructor(
    private readonly project: Project,
    private readonly limit: SearchLimit,
    private readonly onBetter: (plan: ProjectStarts) => void,
  ) {
    this.pairs = pairsApart(project);
    this.usage = usageOf(project);
    this.loads = usageLoads(project, this.pairs);
  }

  /** Puts everything where it may still be to finish by a moment; false where that is proven impossible. */
  settle(matrix: LagMatrix, finish: number): boolean {
    const { activities } = this.project;
    if (!activities.every(({ duration }, at) => matrix.add(at, matrix.origin, duration - finish))) return false;
    for (let before = NaN; ;) {
      if (!keepsApart(this.project, matrix, this.pairs) || !keepsTimetable(this.usage, matrix)) return false;
      const sum = this.windowSum(matrix);
      if (sum === before) return keepsLoads(this.project, matrix, this.loads);
      before = sum;
    }
  }

  /**
   * Searches all that finishes by a moment, nothing of which finishes before `bound`, and tells each better plan. Two ways of choosing conflicts take turns,
   * each time for twice as many nodes, since each finds and proves what the other does not; whichever comes to its end has proven the best. Between them
   * the bound is raised and further serial plans are tried.
   */
  run(
    matrix: LagMatrix,
    known: { readonly finish: number; readonly bound: number; readonly serial: ImprovedStarts },
  ): void {
    [this.by, this.bound] = [known.finish, known.bound];
    for (let turn = 0, nodes = firstTurn_nodes; !this.isStopped && this.bound <= this.by; turn += 1, nodes *= 2) {
      this.choice = turn % 2 === 0 ? 'first' : 'fewest';
      this.turnEnds = this.nodes + nodes;
      this.branch(matrix.copy());
      if (this.nodes < this.turnEnds) return;
      this.raiseBound(matrix, nodes);
      this.tryOrders(known.serial, nodes / 2);
    }
  }

  /** Nothing finishes before this moment. */
  bound = 0;
  private by = 0;
  private choice: ConflictChoice = 'first';
  private turnEnds = Infinity;

  /**
   * Tries for so many nodes whether anything finishes by the bound: what has no room to be late is refuted soonest, and the bound rises by one. What is
   * found there is the best there is (destructive improvement, Klein and Scholl 1999, from memory).
   */
  private raiseBound(matrix: LagMatrix, nodes: number): void {
    this.turnEnds = this.nodes + nodes;
    while (this.bound <= this.by) {
      const asked = this.by;
      this.by = this.bound;
      this.branch(matrix.copy());
      if (this.by < this.bound) return;
      this.by = asked;
      if (this.nodes >= this.turnEnds || this.isStopped) return;
      this.bound += 1;
    }
  }

  private tryOrders(serial: ImprovedStarts, orders: number): void {
    for (let left = orders; left > 0 && this.bound <= this.by && !this.mustStop(); left -= 1) {
      this.nodes += 1;
      const plan = serial.next();
      if (!plan || plan.finish > this.by) continue;
      this.by = plan.finish - 1;
      this.onBetter(plan);
    }
  }

  private branch(matrix: LagMatrix): void {
    while (this.nodes < this.turnEnds && !this.mustStop()) {
      this.nodes += 1;
      if (!this.settle(matrix, this.by)) return;
      const conflict = usageConflict(this.project, matrix, this.choice);
      if (conflict.length === 0) return this.take(matrix);
      const pair = cheapestOrder(this.project, matrix, conflict);
      if (!pair) return;
      const [first, second] = pair;
      const { duration } = this.project.activities[first];
      const after = matrix.copy();
      if (after.add(first, second, duration)) this.branch(after);
      if (!matrix.add(second, first, 1 - duration)) return;
    }
  }

  private take(matrix: LagMatrix): void {
    const starts = this.project.activities.map((_, activity) => matrix.earliest(activity));
    const plan = projectStarts(starts, this.project);
    this.by = plan.finish - 1;
    this.onBetter(plan);
  }

  private mustStop(): boolean {
    const { nodes, shouldStop } = this.limit;
    this.isStopped ||= (nodes !== undefined && this.nodes >= nodes) || (shouldStop?.() ?? false);
    return this.isStopped;
  }

  private windowSum(matrix: LagMatrix): number {
    return this.project.activities.reduce((sum, _, at) => sum + matrix.earliest(at) - matrix.latest(at), 0);
  }
}
