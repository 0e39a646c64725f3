import * as z from 'zod';
import { endsSchema, fluted, lengthEntry } from '#shared/measure/length-schema';

const handEntry = z.enum(['left', 'right']);
const turnsEntry = z.number().min(0).max(1000);

const twistedSectionSchema = z.discriminatedUnion('outline', [
  z.strictObject({
    outline: z.literal('lobed'),
    radius_mm: lengthEntry,
    depth_mm: lengthEntry,
    lobes: z.int().min(1).max(64),
  }),
  z.strictObject({ outline: z.literal('square'), across_mm: lengthEntry }),
]);

/** The legs of `LegShape`, one schema each. */
export const legShapeSchemas = [
  z.strictObject({
    kind: z.literal('straight-leg'),
    section: z.enum(['square', 'octagonal', 'round']),
    length_mm: lengthEntry,
    top_mm: lengthEntry,
    foot_mm: lengthEntry,
    ends: endsSchema,
    ...fluted,
  }),
  z.strictObject({
    kind: z.literal('cabriole'),
    length_mm: lengthEntry,
    girths_mm: z.array(lengthEntry).min(3).max(201),
    ...fluted,
  }),
  z.strictObject({
    kind: z.literal('stations'),
    stations: z
      .array(z.strictObject({ at_mm: lengthEntry, girth_mm: lengthEntry }))
      .min(2)
      .max(201),
    ...fluted,
  }),
  z.strictObject({
    kind: z.literal('twisted'),
    section: twistedSectionSchema,
    length_mm: lengthEntry,
    turns: turnsEntry,
    hand: handEntry,
    ...fluted,
  }),
  z.strictObject({
    kind: z.literal('helicoid'),
    radius_mm: lengthEntry,
    coreRadius_mm: lengthEntry,
    risePerTurn_mm: lengthEntry,
    turns: turnsEntry,
    hand: handEntry,
  }),
] as const;
