import * as z from 'zod';
import { pageOf, pageQuery } from '#shared/actor/page-schema';
import { identifier, instant } from '#shared/problems/entry-schema';

const fieldValue = z.union([z.string(), z.number(), z.boolean()]).nullable();

/** A field that differs, as `FieldChange` has it. */
const fieldChangeSchema = z.strictObject({
  path: z.array(z.string()),
  what: z.enum(['changed', 'added', 'removed', 'moved']),
  before: fieldValue,
  after: fieldValue,
});

/** One entry of the history: who did what to which thing, and when; the code is worded by the reader's catalogue. */
const historyEntryFields = {
  id: identifier,
  at: instant,
  accountId: identifier.nullable(),
  name: z.string(),
  subject: z.strictObject({ kind: z.string(), id: identifier }),
  code: z.string(),
  values: z.record(z.string(), z.union([z.string(), z.number()])),
  changes: z.array(fieldChangeSchema),
};

/** What those without cost see: what happened, and which fields of a job’s things changed, nothing of money; without the whole content. */
export const historyLineSchema = z.strictObject(historyEntryFields);

/** What those who see cost see. */
export const historyEntrySchema = z.strictObject({ ...historyEntryFields, before: z.unknown(), after: z.unknown() });

export const historyQuery = z.strictObject({ ...pageQuery, jobId: identifier.optional() });
export const historyPageSchema = pageOf(historyEntrySchema);
export const historyLinesSchema = pageOf(historyLineSchema);

export type HistoryEntry = z.infer<typeof historyEntrySchema>;
export type HistoryPage = z.infer<typeof historyPageSchema>;
