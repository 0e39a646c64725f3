import * as z from 'zod';
import { identifier, line, optionalLine, paragraphs } from '#shared/problems/entry-schema';

/** Where a job stands. `sent`, `accepted` and `declined` follow from its issues; the others are set by hand. */
export const jobStates = ['open', 'sent', 'accepted', 'declined', 'finished'] as const;
export type JobState = (typeof jobStates)[number];

/** Where the issues of a job have brought it; what is finished goes back to it when it is taken up again. */
export type ReachedState = Exclude<JobState, 'finished'>;

/** Whether the base is made or an old one is worked on: an old one brings its own cautions. */
export const jobKinds = ['new', 'restoration'] as const;

/** What a person enters of a job. */
export const jobContentSchema = z.strictObject({
  title: line(120),
  clientId: identifier,
  kind: z.enum(jobKinds),
  reference: optionalLine(80),
  site: optionalLine(200),
  note: paragraphs(4000),
});
export type JobContent = z.infer<typeof jobContentSchema>;

export const jobSchema = jobContentSchema.extend({
  id: z.uuid(),
  version: z.int(),
  number: z.string(),
  state: z.enum(jobStates),
  clientName: z.string(),
  changedAt: z.string(),
});
export type Job = z.infer<typeof jobSchema>;

/** The orders a list of jobs can stand in: the last changed first, the newest number first, or by title. */
export const jobOrders = ['changed', 'number', 'title'] as const;
export type JobOrder = (typeof jobOrders)[number];
