import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';

/** Low, likely and high of one figure, each within the figure's own bounds; complains where they stand out of order. */
export const tripleEntry = (figure: z.ZodNumber) =>
  z
    .strictObject({ low: figure, likely: figure, high: figure })
    .refine((triple) => triple.low <= triple.likely, { ...complain('triple-low-above'), path: ['low'] })
    .refine((triple) => triple.likely <= triple.high, { ...complain('triple-high-below'), path: ['high'] });
