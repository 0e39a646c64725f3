import type { HoldPoint } from '#shared/buildups/buildup';
import type { Climate } from '#shared/drying/climate';

/** A point of the house factor by which oil dries slower in damp air; straight lines between points and on past the last, level before the first. */
export interface HumidityPoint {
  readonly humidity_percent: number;
  readonly factor: number;
}

/** The part of a rate card that holds drying: house factors, usual waits in working days, the air of shop and site, the week. */
export interface DryingCard {
  readonly shop: Climate;
  readonly site: Climate;
  readonly oilHumidity: readonly HumidityPoint[];
  readonly leastFactor: number;
  readonly mostFactor: number;
  readonly holds_days: Readonly<Record<HoldPoint, number>>;
  /** Days worked in a week, from its first day on. */
  readonly workingDays: number;
  readonly moistureWarning_points: number;
  readonly jointWarning_mm: number;
}
