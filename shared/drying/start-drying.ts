import type { DryingCard } from '#shared/drying/drying-card';

/** Drying a workshop starts from: house values. The wait for a top to be fitted dry is common practice, no source. */
export const startDrying: DryingCard = {
  shop: { temperature_celsius: 20, humidity_percent: 50 },
  site: { temperature_celsius: 21, humidity_percent: 45 },
  oilHumidity: [
    { humidity_percent: 60, factor: 1 },
    { humidity_percent: 75, factor: 1.3 },
    { humidity_percent: 85, factor: 1.6 },
  ],
  leastFactor: 0.4,
  mostFactor: 4,
  holds_days: { 'carving-approved': 2, 'sample-approved': 5, 'top-dry-fitted': 1 },
  workingDays: 5,
  moistureWarning_points: 2,
  jointWarning_mm: 0.5,
};
