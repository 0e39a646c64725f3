import * as z from 'zod';
import { displacementEntry, fluted, lengthEntry } from '#shared/measure/length-schema';

/** The flat faces of `FlatShape`, one schema each. */
export const flatShapeSchemas = [
  z.strictObject({ kind: z.literal('rectangle'), length_mm: lengthEntry, height_mm: lengthEntry, ...fluted }),
  z.strictObject({ kind: z.literal('triangle'), base_mm: lengthEntry, height_mm: lengthEntry }),
  z.strictObject({ kind: z.literal('circle'), diameter_mm: lengthEntry }),
  z.strictObject({ kind: z.literal('ellipse'), length_mm: lengthEntry, height_mm: lengthEntry }),
  z.strictObject({ kind: z.literal('ring'), outerDiameter_mm: lengthEntry, innerDiameter_mm: lengthEntry }),
  z.strictObject({
    kind: z.literal('polygon'),
    points: z
      .array(z.strictObject({ x_mm: displacementEntry, y_mm: displacementEntry }))
      .min(3)
      .max(500),
  }),
] as const;
