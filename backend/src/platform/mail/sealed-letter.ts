import { createCipheriv, createDecipheriv, createHash, randomBytes } from 'node:crypto';
import type { Letter } from './letter';

const kind = 'aes-256-gcm';
const lengths = { nonce: 12, tag: 16 } as const;
const keyOf = (secret: string): Buffer => createHash('sha256').update(`letters ${secret}`).digest();

/** A letter as it waits: a mailed link opens something, so its secret lies in no table, not even until it is sent. */
export interface SealedLetter {
  readonly sealed: string;
}

export function sealedLetter(letter: Letter, secret: string): SealedLetter {
  const nonce = randomBytes(lengths.nonce);
  const cipher = createCipheriv(kind, keyOf(secret), nonce);
  const body = Buffer.concat([cipher.update(JSON.stringify(letter), 'utf8'), cipher.final()]);
  return { sealed: Buffer.concat([nonce, cipher.getAuthTag(), body]).toString('base64') };
}

/** Throws for one that was sealed with another secret, or altered. */
export function openedLetter({ sealed }: SealedLetter, secret: string): Letter {
  const bytes = Buffer.from(sealed, 'base64');
  const body = lengths.nonce + lengths.tag;
  const decipher = createDecipheriv(kind, keyOf(secret), bytes.subarray(0, lengths.nonce));
  decipher.setAuthTag(bytes.subarray(lengths.nonce, body));
  const text = Buffer.concat([decipher.update(bytes.subarray(body)), decipher.final()]).toString('utf8');
  return JSON.parse(text) as Letter;
}
