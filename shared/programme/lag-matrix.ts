import type { Project } from '#shared/programme/project';

/**
 * Longest distances between all starts of a project, kept closed while lags are added. The last place is the origin, time 0: the distance from it is the
 * earliest start, the negative distance to it the latest. −∞ where there is no path. A network is possible in time if and only if no cycle is positive;
 * earliest starts are longest paths (Bartusch, Möhring, Radermacher 1988).
 */
export class LagMatrix {
  readonly origin: number;

  private constructor(
    readonly size: number,
    private readonly distances: Float64Array,
  ) {
    this.origin = size - 1;
  }

  /** Every activity starts at 0 or later, by its release and by the lags; null where the lags contradict each other. */
  static of(project: Project): LagMatrix | null {
    const size = project.activities.length + 1;
    const distances = new Float64Array(size * size).fill(-Infinity);
    for (let at = 0; at < size; at += 1) distances[at * size + at] = 0;
    const matrix = new LagMatrix(size, distances);
    const starts = project.activities.every(({ release }, at) =>
      matrix.add(matrix.origin, at, Math.max(0, release ?? 0)),
    );
    return starts && project.lags.every(({ from, to, least }) => matrix.add(from, to, least)) ? matrix : null;
  }

  at(from: number, to: number): number {
    return this.distances[from * this.size + to];
  }

  earliest(activity: number): number {
    return this.distances[this.origin * this.size + activity];
  }

  latest(activity: number): number {
    return -this.distances[activity * this.size + this.origin];
  }

  copy(): LagMatrix {
    return new LagMatrix(this.size, this.distances.slice());
  }

  /** Adds a lag and closes the distances again; false where it contradicts the others. */
  add(from: number, to: number, least: number): boolean {
    const { size, distances } = this;
    if (least <= distances[from * size + to]) return true;
    if (least + distances[to * size + from] > 0) return false;
    const onward = to * size;
    for (let row = 0; row < size; row += 1) {
      const start = row * size;
      const reached = distances[start + from] + least;
      if (reached <= distances[start + to]) continue;
      for (let column = 0; column < size; column += 1) {
        const length = reached + distances[onward + column];
        if (length > distances[start + column]) distances[start + column] = length;
      }
    }
    return true;
  }
}
