import { Bookings } from '#shared/programme/bookings';
import { firstPosition } from '#shared/programme/earliest-times';
import { holdStretch, placeRoomFrom, type HoldLengths, type HoldState } from '#shared/programme/place-room';
import type { TaskBlock } from '#shared/programme/task-blocks';
import { pointOf, type Crew, type NetworkArc, type Position, type TaskNetwork } from '#shared/programme/task-network';

/**
 * Why a block found no place: an arc to a task that stands fast, an arc that put its tasks off again and again, no hours for a task, or a place that somebody
 * holds who has not left it yet.
 */
export interface PlanFailure {
  readonly task: number;
  readonly arc: NetworkArc | null;
  readonly isHeld: boolean;
  /** Whoever comes later to a place that is held longer than was thought. */
  readonly holder?: number;
}

/** No task, where somebody would have to give way and nobody may. */
const nobody = -1;

/** Tasks of one block may be put off so often before it is given up. */
const mostRemovals = 1000;

interface Bounds {
  start: number;
  end: number;
}

/** Places tasks one block after another as early as people, places and lags allow. */
export class SerialPlan {
  readonly positions: (Position | null)[];
  failure: PlanFailure | null = null;
  private readonly bookings: Bookings;
  private readonly raised: Bounds[];
  private isHeld = false;
  private readonly holds: HoldState;

  constructor(
    private readonly network: TaskNetwork,
    private readonly preferred: readonly (readonly number[] | null)[] = [],
    private readonly lengths: HoldLengths = new Map(),
  ) {
    this.bookings = new Bookings(network.people);
    this.positions = network.tasks.map(() => null);
    this.holds = { positions: this.positions, lengths };
    this.raised = network.tasks.map(({ release: start }) => ({ start, end: -Infinity }));
    network.tasks.forEach(({ anchor }, at) => anchor && this.put(at, anchor));
  }

  /** Puts a task where it is known to stand. */
  put(task: number, position: Position): void {
    this.positions[task] = position;
    this.bookings.add(position.crew.people, position.busyFrom, position.end);
  }

  /** Takes a task out again. */
  lift(task: number): void {
    const position = this.positions[task];
    if (!position) return;
    this.bookings.remove(position.crew.people, position.busyFrom, position.end);
    this.positions[task] = null;
  }

  /**
   * Finds places for all tasks of a block: in their order, and where one comes too late for a lag to another placed already, that one is put off and
   * what came after it is placed anew (unscheduling of Franck, Neumann, Schwindt 2001, from memory; here over calendars). False where none is found.
   */
  placeBlock({ tasks }: TaskBlock): boolean {
    let removals = 0;
    for (const task of tasks) this.raised[task] = { start: this.network.tasks[task].release, end: -Infinity };
    for (let at = 0; at < tasks.length;) {
      const position = this.find(tasks[at]);
      if (!position) return this.fail(tasks, { task: tasks[at], arc: null, isHeld: this.isHeld });
      const broken = this.brokenBy(tasks[at], position);
      if (broken.length === 0) {
        this.put(tasks[at], position);
        const crowded = this.crowdedBy(tasks[at]);
        if (crowded !== null) return this.fail(tasks, { task: tasks[at], arc: null, isHeld: true, holder: crowded });
        at += 1;
        continue;
      }
      removals += 1;
      const fast = broken.find((arc) => this.network.tasks[arc.to].anchor !== null || !tasks.includes(arc.to));
      if (fast || removals > mostRemovals)
        return this.fail(tasks, { task: tasks[at], arc: fast ?? broken[0], isHeld: false });
      at = this.putOff(tasks, at, { position, broken });
    }
    return true;
  }

  private fail(tasks: readonly number[], failure: PlanFailure): false {
    for (const task of tasks) this.lift(task);
    this.failure = failure;
    return false;
  }

  private putOff(
    tasks: readonly number[],
    at: number,
    why: { readonly position: Position; readonly broken: readonly NetworkArc[] },
  ): number {
    let first = at;
    for (const arc of why.broken) {
      const needed = arc.shift.later(pointOf(why.position, arc.fromPoint));
      const raised = this.raised[arc.to];
      if (arc.toPoint === 'start') raised.start = Math.max(raised.start, needed);
      else raised.end = Math.max(raised.end, needed);
      first = Math.min(first, tasks.indexOf(arc.to));
    }
    for (let one = first; one < at; one += 1) this.lift(tasks[one]);
    return first;
  }

  /** The arcs from a task to others placed already that it would break where it is about to stand. */
  private brokenBy(task: number, position: Position): NetworkArc[] {
    return this.network.arcsFrom[task].filter((arc) => {
      const to = this.positions[arc.to];
      return to && arc.shift.later(pointOf(position, arc.fromPoint)) > pointOf(to, arc.toPoint);
    });
  }

  private boundsOf(task: number): Bounds {
    let { start, end } = this.raised[task];
    for (const arc of this.network.arcsTo[task]) {
      const from = this.positions[arc.from];
      if (!from) continue;
      const needed = arc.shift.later(pointOf(from, arc.fromPoint));
      if (arc.toPoint === 'start') start = Math.max(start, needed);
      else end = Math.max(end, needed);
    }
    return { start, end };
  }

  /** The place where a task ends soonest; among equals with whom it was before, then with fewer people. */
  private find(task: number): Position | null {
    const bounds = this.boundsOf(task);
    const preferred = this.preferred[task];
    this.isHeld = false;
    let best: Position | null = null;
    for (const crew of this.network.tasks[task].crews) {
      const found = this.findWith(crew, task, bounds);
      if (!found) continue;
      const isLiked = preferred?.join() === crew.people.join();
      if (!best || found.end < best.end || (found.end === best.end && isLiked)) best = found;
    }
    return best;
  }

  private findWith(crew: Crew, task: number, bounds: Bounds): Position | null {
    const from = { ...bounds };
    for (;;) {
      const found = firstPosition(this.network.tasks[task], crew, from);
      if (!found) return null;
      const { start, end } = found;
      const busy = this.bookings.busyUntil(crew.people, start, end);
      const free = busy ?? this.placesFree(task, found);
      if (free === Infinity) {
        this.isHeld = true;
        return null;
      }
      if (free <= start) return { start, end, busyFrom: start, crew };
      from.start = free;
    }
  }

  /** Who has to leave a place, or come to it later, since a hold that a task ends lasts longer than was thought: nobody, where none of them may; null where there is room. */
  private crowdedBy(task: number): number | null {
    for (const { place, hold } of this.network.closes[task]) {
      const held = hold.from === task ? null : holdStretch(hold, this.positions, this.lengths);
      if (!held || !this.lengths.has(hold)) continue;
      const endOf = (): number => held.end;
      if (placeRoomFrom(place, hold, { start: held.start, endOf, ...this.holds }) === held.start) continue;
      const later = place.holds.filter((other) => {
        const start = this.positions[other.from]?.start ?? -Infinity;
        return (
          other !== hold && start >= held.start && start < held.end && this.network.tasks[other.from].anchor === null
        );
      });
      return later.at(-1)?.from ?? nobody;
    }
    return null;
  }

  private placesFree(task: number, { start, end }: Bounds): number {
    let free = start;
    for (const { place, hold } of this.network.opens[task]) {
      const ends = this.positions[hold.until]?.end;
      const length = hold.until === task ? end - start : (this.lengths.get(hold) ?? Infinity);
      const endOf = (from: number): number => ends ?? from + length;
      free = Math.max(free, placeRoomFrom(place, hold, { start, endOf, ...this.holds }));
    }
    return free;
  }
}
