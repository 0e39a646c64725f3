import * as z from 'zod';
import { letterKinds } from '#shared/agreements/letter-kinds';
import { isBlank, line, paragraphs } from '#shared/problems/entry-schema';

/** The words of a letter as a workshop writes them; which placeholders they may hold depends on the kind. */
export const letterTextSchema = z.strictObject({
  subject: line(200),
  text: paragraphs(8000).refine((text) => !isBlank(text)),
});

/** The words of one kind of letter; version 0 where the workshop has none of its own. */
export const letterTemplateSchema = letterTextSchema.extend({
  kind: z.enum(letterKinds),
  version: z.int(),
  placeholders: z.array(z.string()),
});
export type LetterTemplate = z.infer<typeof letterTemplateSchema>;

/** A letter as it would leave. */
export const letterPreviewSchema = z.strictObject({ subject: z.string(), text: z.string(), html: z.string() });

/** A letter that could not be delivered and was given up. */
export const givenUpLetterSchema = z.strictObject({
  id: z.uuid(),
  to: z.string(),
  subject: z.string(),
  attempts: z.int(),
  writtenAt: z.string(),
  givenUpAt: z.string(),
  lastError: z.string(),
});
