import { firstPosition } from '#shared/programme/earliest-times';
import { holdStretch, type HoldLengths, type HoldState } from '#shared/programme/place-room';
import {
  pointOf,
  type Crew,
  type NetworkArc,
  type NetworkPlace,
  type Position,
  type TaskNetwork,
} from '#shared/programme/task-network';

/** What a plan breaks: hours of its people, a lag, somebody at two places at once, the room of a place, or the first moment a task may start. */
export type PlanBreach =
  | { readonly kind: 'hours' | 'release'; readonly task: number }
  | { readonly kind: 'lag'; readonly task: number; readonly arc: NetworkArc; readonly needed: number }
  | { readonly kind: 'people'; readonly task: number; readonly other: number; readonly person: number }
  | { readonly kind: 'place'; readonly task: number; readonly place: number };

/** Where a task with a crew stands that starts at a moment, or null where they do not work then. */
export function positionAt(
  network: TaskNetwork,
  at: { readonly task: number; readonly crew: Crew; readonly start: number },
): Position | null {
  const task = network.tasks[at.task];
  if (task.anchor) return task.anchor;
  const found = firstPosition(task, at.crew, { start: at.start, end: -Infinity });
  return found?.start === at.start ? { ...found, busyFrom: found.start, crew: at.crew } : null;
}

type Positions = readonly (Position | null)[];

const lagBreaches = ({ arcs }: TaskNetwork, positions: Positions): PlanBreach[] =>
  arcs.flatMap((arc): PlanBreach[] => {
    const [from, to] = [positions[arc.from], positions[arc.to]];
    if (!from || !to) return [];
    const needed = arc.shift.later(pointOf(from, arc.fromPoint));
    return needed > pointOf(to, arc.toPoint) ? [{ kind: 'lag', task: arc.to, arc, needed }] : [];
  });

function peopleBreaches({ people }: TaskNetwork, positions: Positions): PlanBreach[] {
  return Array.from({ length: people }, (_, person) => person).flatMap((person) => {
    const busy = positions
      .flatMap((position, task) =>
        position?.crew.people.includes(person) && position.end > position.busyFrom ? [{ position, task }] : [],
      )
      .sort((a, b) => a.position.busyFrom - b.position.busyFrom || a.task - b.task);
    let latest = -Infinity;
    return busy.flatMap(({ position, task }, at): PlanBreach[] => {
      // Only where somebody is not free yet is it looked for at what.
      const isHeld = latest > position.busyFrom;
      latest = Math.max(latest, position.end);
      const before = isHeld && busy.slice(0, at).find((one) => one.position.end > position.busyFrom);
      return before ? [{ kind: 'people', task, other: before.task, person }] : [];
    });
  });
}

function placeBreaches({ places }: TaskNetwork, positions: Positions, lengths: HoldLengths): PlanBreach[] {
  return places.flatMap((place, at) =>
    place.holds.flatMap(({ from }): PlanBreach[] => {
      const start = positions[from]?.start;
      return start !== undefined && usedAt(place, { positions, lengths }, start) > place.capacity
        ? [{ kind: 'place', task: from, place: at }]
        : [];
    }),
  );
}

function usedAt({ taken, holds }: NetworkPlace, { positions, lengths }: HoldState, moment: number): number {
  const held = holds.map((hold) => holdStretch(hold, positions, lengths)).filter((stretch) => stretch !== null);
  return [...taken, ...held].reduce(
    (sum, { start, end, amount }) => (start <= moment && moment < end ? sum + amount : sum),
    0,
  );
}

/** Everything that positions break; a task without a place has no hours for it, and what it would end lasts as long as is said. Moments in minutes. */
export function planBreaches(
  network: TaskNetwork,
  positions: Positions,
  lengths: HoldLengths = new Map(),
): PlanBreach[] {
  const own = network.tasks.flatMap(({ release, anchor }, task): PlanBreach[] => {
    const position = positions[task];
    if (!position) return [{ kind: 'hours', task }];
    return position.start < release && !anchor ? [{ kind: 'release', task }] : [];
  });
  return [
    ...own,
    ...lagBreaches(network, positions),
    ...peopleBreaches(network, positions),
    ...placeBreaches(network, positions, lengths),
  ];
}
