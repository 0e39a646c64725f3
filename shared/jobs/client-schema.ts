import * as z from 'zod';
import { lineEntry, linkEntry, nameEntry, optionalEmailEntry, textEntry } from '#shared/problems/entry-schema';

/** Who a client is; it decides how papers address them. */
export const clientKinds = ['person', 'firm', 'institution'] as const;

/** What is kept of a client: where papers go and how to reach them. */
export const clientContentSchema = z.strictObject({
  name: nameEntry(),
  kind: z.enum(clientKinds),
  contact: lineEntry(),
  email: optionalEmailEntry,
  telephone: lineEntry(40),
  address: textEntry(600),
  website: linkEntry,
  taxRegistration: lineEntry(40),
  note: textEntry(),
});

export type ClientContent = z.infer<typeof clientContentSchema>;

export const clientSchema = clientContentSchema.extend({ id: z.uuid(), version: z.int(), jobs: z.int() });
export type Client = z.infer<typeof clientSchema>;
