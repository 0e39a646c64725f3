import type { ApartPair } from '#shared/programme/keeps-apart';
import { mayPrecede } from '#shared/programme/keeps-apart';
import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project } from '#shared/programme/project';

/** Which conflict is looked at: the first in time, or the one with the fewest orders left to choose. */
export type ConflictChoice = 'first' | 'fewest';

type Conflict = readonly number[];

/** Who asks together too much of a resource at a moment. */
function conflictAt(moment: number, starts: readonly number[], { activities, capacities }: Project): Conflict | null {
  const there = starts.flatMap((start, one) =>
    start <= moment && moment < start + activities[one].duration ? [one] : [],
  );
  if (there.length < 2) return null;
  for (let k = 0; k < capacities.length; k += 1) {
    let used = 0;
    for (const one of there) used += activities[one].demands[k];
    if (used > capacities[k]) return there.filter((one) => activities[one].demands[k] > 0);
  }
  return null;
}

function ordersLeft(project: Project, matrix: LagMatrix, conflict: Conflict): number {
  let orders = 0;
  for (const one of conflict)
    for (const other of conflict) if (one !== other && mayPrecede(project, matrix, [one, other])) orders += 1;
  return orders;
}

/** Activities that at their earliest starts ask together more of a resource than there is; none where all of them fit. */
export function usageConflict(project: Project, matrix: LagMatrix, choice: ConflictChoice): Conflict {
  const starts = project.activities.map((_, activity) => matrix.earliest(activity));
  const moments = [...new Set(starts)].sort((a, b) => a - b);
  let [fewest, left]: [Conflict, number] = [[], Infinity];
  for (const moment of moments) {
    const conflict = conflictAt(moment, starts, project);
    if (!conflict) continue;
    if (choice === 'first') return conflict;
    const orders = ordersLeft(project, matrix, conflict);
    if (orders < left) [fewest, left] = [conflict, orders];
  }
  return fewest;
}

/** How late the whole would end at the least if the second of a pair started after the first. */
function finishAfter(project: Project, matrix: LagMatrix, [first, second]: ApartPair): number {
  const start = matrix.earliest(first) + project.activities[first].duration;
  let finish = start;
  project.activities.forEach(({ duration }, activity) => {
    const end = start + matrix.at(second, activity) + duration;
    if (end > finish) finish = end;
  });
  return finish;
}

/** The order of two activities of a conflict that costs least, earliest put off least among equals; null where no order is left to choose. */
export function cheapestOrder(project: Project, matrix: LagMatrix, conflict: readonly number[]): ApartPair | null {
  let best: { readonly pair: ApartPair; readonly finish: number; readonly delay: number } | null = null;
  for (const first of conflict)
    for (const second of conflict) {
      if (first === second || !mayPrecede(project, matrix, [first, second])) continue;
      const finish = finishAfter(project, matrix, [first, second]);
      const delay = matrix.earliest(first) + project.activities[first].duration - matrix.earliest(second);
      if (best && (best.finish < finish || (best.finish === finish && best.delay <= delay))) continue;
      best = { pair: [first, second], finish, delay };
    }
  return best?.pair ?? null;
}
