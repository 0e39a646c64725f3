import { hash, verify } from '@node-rs/argon2';

/** argon2id (the package's own default) with the parameters of the OWASP Password Storage Cheat Sheet: m = 19 MiB, t = 2, p = 1. */
const strength = { memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** What one keyboard writes as one sign and another as two is made the same (NIST SP 800-63B-4); nothing is cut off or trimmed. */
const normalised = (password: string): string => password.normalize('NFKC');

export const hashPassword = (password: string): Promise<string> => hash(normalised(password), strength);

const nobodys = hashPassword('nobody has this password');

/** Whether a password fits; for somebody unknown it takes as long to say no. */
export async function fitsPassword(password: string, kept: string | undefined): Promise<boolean> {
  const fits = await verify(kept ?? (await nobodys), normalised(password));
  return fits && kept !== undefined;
}
