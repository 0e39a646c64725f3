import type { LagShift } from '#shared/programme/lag-shift';
import type { TaskPoint } from '#shared/programme/programme-request';
import type { WorkingSpans } from '#shared/programme/working-spans';

/** People who may do a task together, by their places, the hours they have in common, and the minutes of those it takes them. */
export interface Crew {
  readonly people: readonly number[];
  readonly spans: WorkingSpans;
  readonly work: number;
}

/** Where a task stands in a plan: its two moments and who does it. `busyFrom` is later than its start where part of it is done already. */
export interface Position {
  readonly start: number;
  readonly end: number;
  readonly busyFrom: number;
  readonly crew: Crew;
}

/** A task made ready to be placed again and again; `anchor` is where it stands already, whatever else moves. */
export interface NetworkTask {
  readonly crews: readonly Crew[];
  readonly isBreakable: boolean;
  readonly release: number;
  readonly anchor: Position | null;
}

/** `to` is at least as late as the shift of `from`; both sides of every lag take this form, a most lag from its later point to its earlier one. */
export interface NetworkArc {
  readonly from: number;
  readonly fromPoint: TaskPoint;
  readonly to: number;
  readonly toPoint: TaskPoint;
  readonly shift: LagShift;
  /** The lag or approval it comes from, and which side of it. */
  readonly sourceId: string;
  readonly side: 'least' | 'most';
}

/** Room held from the start of one task to the end of another. */
export interface NetworkHold {
  readonly from: number;
  readonly until: number;
  readonly amount: number;
}

/** Racks or benches of one kind: what is promised elsewhere, and who of these tasks wants it. */
export interface NetworkPlace {
  readonly capacity: number;
  readonly taken: readonly { readonly start: number; readonly end: number; readonly amount: number }[];
  readonly holds: readonly NetworkHold[];
}

/** A hold with the place it is of. */
export interface HoldOfPlace {
  readonly place: NetworkPlace;
  readonly hold: NetworkHold;
}

/** A request in places and moments, seen forward or backward in time. */
export interface TaskNetwork {
  readonly tasks: readonly NetworkTask[];
  readonly arcs: readonly NetworkArc[];
  readonly arcsTo: readonly (readonly NetworkArc[])[];
  readonly arcsFrom: readonly (readonly NetworkArc[])[];
  readonly places: readonly NetworkPlace[];
  /** The holds a task opens and those it ends. */
  readonly opens: readonly (readonly HoldOfPlace[])[];
  readonly closes: readonly (readonly HoldOfPlace[])[];
  readonly people: number;
}

/** A network of its tasks, arcs and places, with what is asked of them often looked up once. */
export function taskNetwork(parts: Pick<TaskNetwork, 'tasks' | 'arcs' | 'places' | 'people'>): TaskNetwork {
  const { tasks, arcs, places } = parts;
  const arcsTo: NetworkArc[][] = tasks.map(() => []);
  const arcsFrom: NetworkArc[][] = tasks.map(() => []);
  for (const arc of arcs) {
    arcsTo[arc.to].push(arc);
    arcsFrom[arc.from].push(arc);
  }
  const opens: HoldOfPlace[][] = tasks.map(() => []);
  const closes: HoldOfPlace[][] = tasks.map(() => []);
  for (const place of places)
    for (const hold of place.holds) {
      opens[hold.from].push({ place, hold });
      closes[hold.until].push({ place, hold });
    }
  return { ...parts, arcsTo, arcsFrom, opens, closes };
}

/** The moment of one point of a task that stands somewhere. */
export const pointOf = (position: Pick<Position, 'start' | 'end'>, point: TaskPoint): number =>
  point === 'start' ? position.start : position.end;
