import type { BuildUpStep } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import { countUp } from '#shared/money/settled';

/** The likely hands-on hours and coats of one step over a whole lot. */
export interface StepLoad {
  readonly hours: number;
  readonly coats: number;
}

/**
 * Days on which a step of a lot is set up: as many productive days as its hours fill, or a day for each coat that has to dry a working day or longer
 * before the next. Not the days of the sequence, which set-up makes longer itself. None for a step without work, or for recutting, which is carver's
 * work.
 */
export function setUpDays(step: BuildUpStep, load: StepLoad, card: BuildUpCard): number {
  if (load.hours <= 0 || step.work.way === 'recutting') return 0;
  const productive_hours = (card.workingDay_hours * card.productiveShare_percent) / 100;
  const dryOvernight = step.drying.betweenCoats_minutes.likely >= card.workingDay_hours * 60;
  return Math.max(countUp(load.hours / productive_hours), dryOvernight ? load.coats : 1);
}
