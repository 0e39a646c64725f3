import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';

/** No length that is kept is shorter; what is divided by one stays within what can be reckoned with. */
export const least_mm = 0.001;

/** Whether a length in mm is none, or long enough to be kept; less than none is for another rule. */
export const isNoLengthOrKept = (length_mm: number): boolean => length_mm <= 0 || length_mm >= least_mm;
/** What is said of a length shorter than any that is kept. */
export const shorterThanKept = complain('entry-too-small', { minimum_mm: least_mm });

/** A size in mm: none, or a thousandth of a millimetre to under 100 m. */
export const lengthEntry = z.number().min(0).lt(1e5).refine(isNoLengthOrKept, shorterThanKept);

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
