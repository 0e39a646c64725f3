import * as z from 'zod';
import { least_mm } from '#shared/measure/length-schema';
import { asTyped } from '#shared/problems/entry-schema';

/** A joint across the grain, to see how it moves: entered, worked and forgotten. */
export const jointSchema = z.strictObject({
  width_mm: z.number().min(least_mm).max(1e5),
  timberId: asTyped(80).min(1),
  cut: z.enum(['radial', 'tangential']),
  isGessoed: z.boolean(),
});
export type Joint = z.infer<typeof jointSchema>;
