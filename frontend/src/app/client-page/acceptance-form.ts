import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';
import { line } from '#shared/problems/entry-schema';

/** What a client enters to accept: their name, and that they mean it. */
export const acceptanceFormSchema = z.strictObject({
  typedName: line(120),
  agrees: z.boolean().refine((agrees) => agrees, complain('acceptance-not-ticked')),
});
