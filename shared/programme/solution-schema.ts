import * as z from 'zod';
import { day, identifier } from '#shared/problems/entry-schema';
import { minutes, programmePlanSchema } from '#shared/programme/programme-schema';

/** How long the server may look for a better plan; `keepsPlan`: from the plan kept last nothing moves that need not. */
export const solutionRequestSchema = z.strictObject({ seconds: z.int().min(1).max(60), keepsPlan: z.boolean() });

/** `outdated`: a plan was found, but the programme was changed meanwhile, so it was not kept. */
export const solutionStates = ['waiting', 'working', 'done', 'stopped', 'outdated', 'failed'] as const;
export type SolutionState = (typeof solutionStates)[number];

/** Planning on the server: how far it is, and the best plan so far in minutes from the start of `firstDay`. */
export const solutionSchema = z.strictObject({
  id: identifier,
  estimateId: identifier,
  state: z.enum(solutionStates),
  /** The version of the programme it is worked from. */
  programmeVersion: z.int(),
  firstDay: day,
  plans: z.int(),
  finish_minutes: minutes.nullable(),
  lowerBound_minutes: minutes.nullable(),
  plan: programmePlanSchema.nullable(),
});
export type SolutionAnswer = z.infer<typeof solutionSchema>;
