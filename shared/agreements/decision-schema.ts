import * as z from 'zod';

/** What a client decided on an issue, as the workshop reads it: when, from which address, what was chosen, and of which exact paper. */
export const decisionSchema = z.strictObject({
  id: z.uuid(),
  issueId: z.uuid(),
  /** What was decided on, as papers name it, with its letter. */
  number: z.string(),
  kind: z.enum(['accepted', 'declined']),
  typedName: z.string(),
  at: z.string(),
  address: z.string(),
  choice: z.array(z.uuid()),
  /** What was chosen, by name. */
  alternatives: z.array(z.string()),
  reason: z.string(),
  net_minor: z.int(),
  tax_minor: z.int(),
  gross_minor: z.int(),
  /** SHA-256 of the paper that was accepted; empty where the issue was declined. */
  pdfSha256: z.string(),
});
export type Decision = z.infer<typeof decisionSchema>;
