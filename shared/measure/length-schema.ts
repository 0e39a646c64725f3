import * as z from 'zod';

/** A size in mm: 0 to under 100 m. */
export const lengthEntry = z.number().min(0).lt(1e5);

/** A displacement in mm, either way. */
export const displacementEntry = z.number().gt(-1e5).lt(1e5);

/** An area in mm², to under 10,000 m². */
export const areaEntry = z.number().min(0).lt(1e10);

/** A share in per cent, 0 to 100. */
export const shareEntry = z.number().min(0).max(100);

export const endsSchema = z.strictObject({ top: z.boolean(), bottom: z.boolean() });

export const flutingSchema = z.strictObject({
  cut: z.enum(['flutes', 'reeds', 'v-grooves']),
  width_mm: lengthEntry,
  depth_mm: lengthEntry,
  between_mm: lengthEntry,
  share_percent: shareEntry,
});

/** The key every shape with a girth may have. */
export const fluted = { fluting: flutingSchema.optional() };
