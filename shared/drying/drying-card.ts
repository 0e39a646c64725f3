import type { HoldPoint } from '#shared/buildups/buildup';
import type { Climate } from '#shared/drying/climate';

/** A point of the house factor by which oil dries slower in damp air; between points straight lines, below the first level. */
export interface HumidityPoint {
  readonly humidity_percent: number;
  readonly factor: number;
}

/** The working week hands-on work is laid into. */
export interface WorkingWeek {
  readonly day_minutes: number;
  readonly days: number;
  readonly productiveShare_percent: number;
}

/** The part of a rate card that holds drying: house factors, usual waits in working days, the air of shop and site, the week. */
export interface DryingCard {
  readonly shop: Climate;
  readonly site: Climate;
  readonly oilHumidity: readonly HumidityPoint[];
  readonly leastFactor: number;
  readonly mostFactor: number;
  readonly holds_days: Readonly<Record<HoldPoint, number>>;
  readonly workingDays: number;
  readonly moistureWarning_points: number;
  readonly jointWarning_mm: number;
}
