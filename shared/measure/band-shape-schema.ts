import * as z from 'zod';
import { fluted, lengthEntry } from '#shared/measure/length-schema';

const bandPartSchema = z.discriminatedUnion('part', [
  z.strictObject({ part: z.literal('straight'), length_mm: lengthEntry }),
  z.strictObject({ part: z.literal('curve'), radius_mm: lengthEntry, angle_degrees: z.number().min(0).max(360) }),
]);

const bandLengthSchema = z.discriminatedUnion('by', [
  z.strictObject({ by: z.literal('tape'), length_mm: lengthEntry }),
  z.strictObject({ by: z.literal('parts'), parts: z.array(bandPartSchema).min(1).max(200) }),
]);

export const bandShapeSchema = z.strictObject({
  kind: z.literal('band'),
  length: bandLengthSchema,
  height_mm: lengthEntry,
  closed: z.boolean(),
  // A stretch under a centimetre is a slip of the hand, and would fill the drawing with lines.
  stretch_mm: z.number().min(10).lt(1e5).optional(),
  ...fluted,
});
