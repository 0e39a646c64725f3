import * as z from 'zod';
import {
  line,
  optionalEmailAddress,
  optionalLine,
  optionalWebAddress,
  paragraphs,
} from '#shared/problems/entry-schema';

/** Who a client is; it decides how papers address them. */
export const clientKinds = ['person', 'firm', 'institution'] as const;

/** What is kept of a client: where papers go and how to reach them. */
export const clientContentSchema = z.strictObject({
  name: line(120),
  kind: z.enum(clientKinds),
  contact: optionalLine(200),
  email: optionalEmailAddress,
  telephone: optionalLine(40),
  address: paragraphs(600),
  website: optionalWebAddress,
  taxRegistration: optionalLine(40),
  note: paragraphs(4000),
});

export type ClientContent = z.infer<typeof clientContentSchema>;

export const clientSchema = clientContentSchema.extend({ id: z.uuid(), version: z.int(), jobs: z.int() });
export type Client = z.infer<typeof clientSchema>;
