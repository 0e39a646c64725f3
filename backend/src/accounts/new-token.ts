import { createHash, randomBytes } from 'node:crypto';

export const hashOfToken = (token: string): string => createHash('sha256').update(token).digest('hex');

/** A secret of 256 bits for a mailed link, and the hash under which it is kept. */
export function newToken(): { token: string; tokenHash: string } {
  const token = randomBytes(32).toString('base64url');
  return { token, tokenHash: hashOfToken(token) };
}
