import * as z from 'zod';
import { complainAt, factorEntry } from '#shared/problems/card-entry-schema';
import type { DryingCard, HumidityPoint } from '#shared/drying/drying-card';
import { complain } from '#shared/problems/complaints-of';

const humidity = z.number().min(0).max(100);

/** The air of a room. */
export const climateSchema = z.strictObject({
  temperature_celsius: z.number().min(-10).max(45),
  humidity_percent: humidity,
});

function humidityRises(points: readonly HumidityPoint[], context: z.core.$RefinementCtx): void {
  points.forEach((point, at) => {
    const before = points[at - 1];
    if (before && point.humidity_percent <= before.humidity_percent) {
      complainAt(context, [at, 'humidity_percent'], complain('entry-not-above', { minimum: before.humidity_percent }));
    }
  });
}

const days = z.int().min(0).max(365);

/** The drying part of a rate card. */
export const dryingCardSchema = z.strictObject({
  shop: climateSchema,
  site: climateSchema,
  oilHumidity: z
    .array(z.strictObject({ humidity_percent: humidity, factor: factorEntry }))
    .min(1)
    .max(10)
    .superRefine(humidityRises),
  leastFactor: z.number().gt(0).max(1),
  mostFactor: z.number().min(1).max(100),
  holds_days: z.strictObject({ 'carving-approved': days, 'sample-approved': days, 'top-dry-fitted': days }),
  workingDays: z.int().min(1).max(7),
  moistureWarning_points: z.number().min(0).max(30),
  jointWarning_mm: z.number().min(0).max(50),
}) satisfies z.ZodType<DryingCard>;
