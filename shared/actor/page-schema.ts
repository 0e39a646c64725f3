import * as z from 'zod';

/** The query every list understands: a page size, and where the page before it ended. */
export const pageQuery = {
  cursor: z.string().max(700).optional(),
  limit: z.coerce.number().int().min(1).max(100).default(50),
};

/** One page of a list. Counting stops at 1,000: `countIsExact` says whether there may be more. */
export const pageOf = <S extends z.ZodType>(item: S) =>
  z.strictObject({ items: z.array(item), next: z.string().nullable(), count: z.int(), countIsExact: z.boolean() });
