import * as z from 'zod';
import { endsSchema, fluted, lengthEntry } from '#shared/measure/length-schema';

const chosen = z.boolean();

const foot = { diameter_mm: lengthEntry, cutTop_mm: lengthEntry, cutBottom_mm: lengthEntry, ends: endsSchema };

/** The solids of `SolidShape`, one schema each. */
export const solidShapeSchemas = [
  z.strictObject({ kind: z.literal('sphere'), diameter_mm: lengthEntry }),
  z.strictObject({ kind: z.literal('ball-foot'), ...foot }),
  z.strictObject({ kind: z.literal('bun-foot'), ...foot, height_mm: lengthEntry }),
  z.strictObject({ kind: z.literal('torus'), centreDiameter_mm: lengthEntry, sectionDiameter_mm: lengthEntry }),
  z.strictObject({
    kind: z.literal('cone'),
    bottomDiameter_mm: lengthEntry,
    topDiameter_mm: lengthEntry,
    height_mm: lengthEntry,
    ends: endsSchema,
    ...fluted,
  }),
  z.strictObject({
    kind: z.literal('box'),
    length_mm: lengthEntry,
    depth_mm: lengthEntry,
    height_mm: lengthEntry,
    faces: z.strictObject({
      top: chosen,
      bottom: chosen,
      front: chosen,
      back: chosen,
      left: chosen,
      right: chosen,
    }),
  }),
  z.strictObject({ kind: z.literal('boss'), diameter_mm: lengthEntry, height_mm: lengthEntry }),
] as const;
