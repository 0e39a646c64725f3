import * as z from 'zod';
import { lengthUnits } from '#shared/units/length-unit';

/** Whose page a client reads, and how figures are written on it. */
export const clientLetterheadSchema = z.strictObject({
  name: z.string(),
  addressLines: z.array(z.string()),
  telephone: z.string(),
  email: z.string(),
  taxRegistration: z.string(),
  hasLogo: z.boolean(),
  currency: z.string(),
  locale: z.string(),
  lengthUnit: z.enum(lengthUnits),
  timeZone: z.string(),
});
export type ClientLetterhead = z.infer<typeof clientLetterheadSchema>;
