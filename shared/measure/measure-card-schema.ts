import * as z from 'zod';
import { reliefs } from '#shared/measure/relief';

// A surface is never less than its plan; ten times as much is no relief any more.
const factorEntry = z.number().min(1).max(10);

/** What a rate card may say about measuring: every relief with its factor, 1 to 10. */
export const measureCardSchema = z.strictObject({
  reliefFactors: z.strictObject(
    Object.fromEntries(reliefs.map((relief) => [relief, factorEntry])) as Record<
      (typeof reliefs)[number],
      typeof factorEntry
    >,
  ),
  measuredInTheRoundFactor: factorEntry,
});
