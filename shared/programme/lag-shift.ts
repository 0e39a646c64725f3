import type { LagProgress } from '#shared/programme/lag-progress';

/** One side of a lag: the earliest moment of what follows, and the latest of what went before; each is the other's inverse as far as there is one. */
export interface LagShift {
  readonly later: (moment: number) => number;
  readonly earlier: (moment: number) => number;
}

/** At least so much progress from one moment to the other; below 0, the first may follow the second by as much at the most. */
export function lagShift(progress: LagProgress, least: number): LagShift {
  if (least < 0)
    return {
      later: (moment) => progress.first(progress.at(moment) + least),
      earlier: (moment) => progress.last(progress.at(moment) - least),
    };
  return {
    later: (moment) => Math.max(moment, progress.first(progress.at(moment) + least)),
    earlier: (moment) => Math.min(moment, progress.last(progress.at(moment) - least)),
  };
}

/** The shift seen backward, when moment t has become −t. */
export const mirroredShift = ({ later, earlier }: LagShift): LagShift => ({
  later: (moment) => -earlier(-moment),
  earlier: (moment) => -later(-moment),
});
