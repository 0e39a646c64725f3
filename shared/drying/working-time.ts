import type { BuildUpCard } from '#shared/buildups/buildup-card';
import type { DryingCard } from '#shared/drying/drying-card';

/** The simple week hands-on work is laid into: so many minutes a day, on the first days of each seven, of which a share is productive. */
export interface WorkingTime {
  readonly day_minutes: number;
  readonly days: number;
  readonly productiveShare_percent: number;
}

/** The working week of a rate card. */
export const workingTime = (buildUps: BuildUpCard, drying: DryingCard): WorkingTime => ({
  day_minutes: Math.round(buildUps.workingDay_hours * 60),
  days: drying.workingDays,
  productiveShare_percent: buildUps.productiveShare_percent,
});
