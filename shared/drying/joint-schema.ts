import * as z from 'zod';

/** A joint across the grain, to see how it moves: entered, worked and forgotten. */
export const jointSchema = z.strictObject({
  width_mm: z.number().gt(0).max(1e5),
  timberId: z.string().min(1),
  cut: z.enum(['radial', 'tangential']),
  isGessoed: z.boolean(),
});
export type Joint = z.infer<typeof jointSchema>;
