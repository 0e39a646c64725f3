import { seededGenerator, type Generator32 } from '#shared/estimates/risk/seeded-generator';
import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project, ProjectStarts } from '#shared/programme/project';
import { projectStarts } from '#shared/programme/project-starts';
import { placedBefore, serialStarts, type Priorities } from '#shared/programme/serial-starts';

/** Orders tried before the exact search begins; fewer for large projects, whose every plan takes long. */
const orders = ({ activities }: Project): number =>
  Math.max(4, Math.min(400, Math.floor(8000 / (activities.length + 1))));

/** How late an activity may start if all is to end by its earliest finish. */
function latestStarts({ activities }: Project, matrix: LagMatrix): number[] {
  return activities.map(
    (_, one) => -Math.max(...activities.map(({ duration }, other) => matrix.at(one, other) + duration)),
  );
}

const shaken = (priorities: Priorities, share: number, next: Generator32): number[] => {
  const spread = Math.max(1, Math.max(...priorities) - Math.min(...priorities)) * share;
  return priorities.map((priority) => priority + (spread * next()) / 2 ** 32);
};

/** The best of many serial plans: by latest start, by earliest start, by both, and by seeded variations of the best of them; null where none came out. */
export function improvedStarts(project: Project, matrix: LagMatrix, bound: number): ProjectStarts | null {
  const next = seededGenerator(project.activities.length);
  const late = latestStarts(project, matrix);
  const early = late.map((_, at) => matrix.earliest(at));
  const rules = [late, early, late.map((latest, at) => latest + early[at])];
  const serial = { project, matrix, before: placedBefore(project, matrix) };
  let best: ProjectStarts | null = null;
  for (let tried = 0; tried < orders(project) && best?.finish !== bound; tried += 1) {
    const base: Priorities = tried % 2 === 1 && best ? best.starts : late;
    const starts = serialStarts(serial, rules[tried] ?? shaken(base, 0.1 + 0.05 * (tried % 7), next));
    const plan = starts && projectStarts(starts, project);
    if (plan && (!best || plan.finish < best.finish)) best = plan;
  }
  return best;
}
