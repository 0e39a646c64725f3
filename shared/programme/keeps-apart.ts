import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project } from '#shared/programme/project';

/** Two activities that cannot be at work together. */
export type ApartPair = readonly [number, number];

/** Whether two activities together ask more of a resource than there is. */
function areApart(project: Project, one: number, other: number): boolean {
  const [first, second] = [project.activities[one], project.activities[other]];
  if (first.duration === 0 || second.duration === 0) return false;
  return project.capacities.some((capacity, k) => first.demands[k] + second.demands[k] > capacity);
}

/** All pairs of activities that cannot be at work together, each once. */
export const pairsApart = (project: Project): ApartPair[] =>
  project.activities.flatMap((_, one) =>
    project.activities.slice(one + 1).flatMap((_activity, beyond): ApartPair[] => {
      const other = one + 1 + beyond;
      return areApart(project, one, other) ? [[one, other]] : [];
    }),
  );

/** Whether one may still end before the other starts. */
export const mayPrecede = (project: Project, matrix: LagMatrix, [one, other]: ApartPair): boolean =>
  matrix.at(other, one) + project.activities[one].duration <= 0;

/** Whether one surely ends before the other starts. */
export const doesPrecede = (project: Project, matrix: LagMatrix, [one, other]: ApartPair): boolean =>
  matrix.at(one, other) >= project.activities[one].duration;

/** Orders one pair where only one order is left: 0 nothing new, 1 ordered, −1 no order is left. */
function ordered(project: Project, matrix: LagMatrix, [one, other]: ApartPair): number {
  if (doesPrecede(project, matrix, [one, other]) || doesPrecede(project, matrix, [other, one])) return 0;
  const [forth, back] = [mayPrecede(project, matrix, [one, other]), mayPrecede(project, matrix, [other, one])];
  if (forth && back) return 0;
  if (!forth && !back) return -1;
  const [first, second] = forth ? [one, other] : [other, one];
  return matrix.add(first, second, project.activities[first].duration) ? 1 : -1;
}

/** Orders every pair that cannot be at work together and has only one order left, until nothing new follows; false where none is left. */
export function keepsApart(project: Project, matrix: LagMatrix, pairs: readonly ApartPair[]): boolean {
  for (let isMoving = true; isMoving;) {
    isMoving = false;
    for (const pair of pairs) {
      const result = ordered(project, matrix, pair);
      if (result < 0) return false;
      if (result > 0) isMoving = true;
    }
  }
  return true;
}
