import type * as z from 'zod';
import { configSchema } from './config-schema';

export type Config = Readonly<z.infer<typeof configSchema>>;

/** Reads the environment; throws one error that names every variable that is missing or wrong, and none of their values. */
export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const read = configSchema.safeParse(environment);
  if (read.success) return read.data;
  const complaints = read.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`);
  throw new Error(`The server cannot start with these settings. ${complaints.join('; ')}`);
}
