import { seededGenerator, type Generator32 } from '#shared/estimates/risk/seeded-generator';
import type { LagMatrix } from '#shared/programme/lag-matrix';
import type { Project, ProjectStarts } from '#shared/programme/project';
import { projectStarts } from '#shared/programme/project-starts';
import { placedBefore, serialStarts, type Priorities, type SerialBase } from '#shared/programme/serial-starts';

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

/**
 * Serial plans of one project, each from a further order: by latest start, by earliest start, by both, and then by seeded variations of the best so far and,
 * every third time, of the latest starts.
 */
export class ImprovedStarts {
  best: ProjectStarts | null = null;
  private tried = 0;
  private readonly draws: Generator32;
  private readonly late: Priorities;
  private readonly rules: readonly Priorities[];
  private readonly serial: SerialBase;

  constructor(
    private readonly project: Project,
    matrix: LagMatrix,
  ) {
    this.draws = seededGenerator(project.activities.length);
    this.late = latestStarts(project, matrix);
    const early = this.late.map((_, at) => matrix.earliest(at));
    this.rules = [this.late, early, this.late.map((latest, at) => latest + early[at])];
    this.serial = { project, matrix, before: placedBefore(project, matrix) };
  }

  /** The plan of the next order; null where that leads nowhere. */
  next(): ProjectStarts | null {
    const base = this.tried % 3 > 0 && this.best ? this.best.starts : this.late;
    const order = this.rules[this.tried] ?? shaken(base, 0.05 + 0.07 * (this.tried % 7), this.draws);
    this.tried += 1;
    const starts = serialStarts(this.serial, order);
    const plan = starts && projectStarts(starts, this.project);
    // One that is as good is taken too, so that variations do not stay round the first.
    if (plan && (!this.best || plan.finish <= this.best.finish)) this.best = plan;
    return plan;
  }

  /** The best of the first orders, fewer where one finishes by the bound; null where none came out. */
  first(bound: number): ProjectStarts | null {
    for (let left = orders(this.project); left > 0 && this.best?.finish !== bound; left -= 1) this.next();
    return this.best;
  }
}
