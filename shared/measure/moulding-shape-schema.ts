import * as z from 'zod';
import { displacementEntry, endsSchema, fluted, lengthEntry } from '#shared/measure/length-schema';
import { classicalMembers } from '#shared/measure/profile-element';
import { asTyped } from '#shared/problems/entry-schema';

const drawn = { id: asTyped(64).min(1), across_mm: displacementEntry, up_mm: displacementEntry };

/** One element of a profile: a classical member, a line or an arc. */
export const profileElementSchema = z.discriminatedUnion('element', [
  z.strictObject({
    id: drawn.id,
    element: z.enum(classicalMembers),
    height_mm: lengthEntry,
    projection_mm: lengthEntry,
    going: z.enum(['out', 'in']),
  }),
  z.strictObject({ ...drawn, element: z.literal('line') }),
  z.strictObject({ ...drawn, element: z.literal('arc'), bow_mm: displacementEntry }),
]);

const profileSchema = z.array(profileElementSchema).min(1).max(60);
const sidesEntry = z.array(lengthEntry).min(1).max(100);

/** The plans a moulding can run along. A mitre sharper than 170° would run out to a needle. */
export const mouldingPlanSchema = z.discriminatedUnion('form', [
  z.strictObject({ form: z.literal('straight'), sides_mm: sidesEntry, returns_mm: z.array(lengthEntry).max(200) }),
  z.strictObject({ form: z.literal('arc'), radius_mm: lengthEntry, angle_degrees: z.number().min(0).max(360) }),
  z.strictObject({ form: z.literal('ellipse'), length_mm: lengthEntry, width_mm: lengthEntry }),
  z.strictObject({
    form: z.literal('polygon'),
    sides_mm: sidesEntry,
    turns_degrees: z.array(z.number().min(-170).max(170)).max(100),
    closed: z.boolean(),
  }),
]);

export const mouldingShapeSchema = z.strictObject({
  kind: z.literal('moulding'),
  profile: profileSchema,
  plan: mouldingPlanSchema,
  measuredAt: z.enum(['back', 'front']),
  facing: z.enum(['outward', 'inward']),
  ...fluted,
});

export const turnedShapeSchema = z.strictObject({
  kind: z.literal('turned'),
  profile: profileSchema,
  radius_mm: lengthEntry,
  ends: endsSchema,
  ...fluted,
});
