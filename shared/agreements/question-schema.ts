import * as z from 'zod';
import { isBlank, paragraphs } from '#shared/problems/entry-schema';

/** What somebody writes into the thread of a job: something, at most 4,000 characters. */
export const questionText = paragraphs(4000).refine((text) => !isBlank(text));

/** One entry of a thread, as both sides read it. */
export const questionSchema = z.strictObject({
  id: z.uuid(),
  issueId: z.uuid(),
  author: z.enum(['client', 'workshop']),
  name: z.string(),
  text: z.string(),
  at: z.string(),
});
export type Question = z.infer<typeof questionSchema>;
