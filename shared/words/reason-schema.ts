import * as z from 'zod';
import type { Finding } from '#shared/words/finding';
import type { FigureUnit } from '#shared/words/reason';
import type { WordCode } from '#shared/words/word-code';

const values = z.record(z.string(), z.union([z.string(), z.number()]));
const code = z.string() as unknown as z.ZodType<WordCode>;

/** One step of an explanation as it is sent. */
export const reasonSchema = z.strictObject({
  code,
  values,
  figure: z.union([z.number(), z.string()]),
  unit: z.string() as unknown as z.ZodType<FigureUnit>,
  house: z.string().optional(),
});

/** One finding as it is sent. */
export const findingSchema = z.strictObject({
  kind: z.enum(['refuse', 'missing', 'warn', 'caution', 'note'] satisfies Finding['kind'][]),
  code,
  values,
  about: z.string().optional(),
});
