import { canary } from './canary';

/** What went to and fro in this run and may stand in no log: cookies, tokens, passwords, and the other workshop's texts. */
const words = new Set<string>([canary, 'argon2id']);
const tokens = new Set<string>();

const isToken = (text: string): boolean => /^[\w-]{22,}$/.test(text);

/** Notes a secret that was sent or received. */
export function noteSecret(text: unknown): void {
  if (typeof text !== 'string' || text.length < 12 || text.length > 300) return;
  if (isToken(text)) tokens.add(text);
  else words.add(text);
}

/** A cookie holds the session's id and its signature; either is a secret. */
export function noteCookie(value: string): void {
  for (const part of decodeURIComponent(value).replace(/^s:/, '').split('.')) noteSecret(part);
}

/** Notes what a body holds of secrets, by the names of its entries. */
export function noteSecretsOf(body: unknown): void {
  if (body === null || typeof body !== 'object') return;
  const entries = body as Record<string, unknown>;
  for (const name of ['password', 'current', 'token', 'secret']) noteSecret(entries[name]);
}

/** Notes the secret of an address that was made: it stands behind # or in the query. */
export function noteSecretOfAddress(address: unknown): void {
  if (typeof address === 'string') noteSecret(/(?:#|secret=)([\w-]{22,})/.exec(address)?.[1]);
}

/** What is wrong with a log: lines that hold a secret, and events that are not one line of JSON. */
export function faultsOfLog(lines: readonly string[]): string[] {
  const isOneEvent = (line: string): boolean => {
    try {
      return line.indexOf('\n') === line.length - 1 && typeof JSON.parse(line) === 'object';
    } catch {
      return false;
    }
  };
  return lines.flatMap((line) => [
    ...(isOneEvent(line) ? [] : [`not one line: ${line.slice(0, 200)}`]),
    ...((line.match(/[\w-]{22,}/g) ?? []).some((piece) => tokens.has(piece)) ? [`a token: ${line.slice(0, 300)}`] : []),
    ...[...words].filter((word) => line.includes(word)).map(() => `a secret: ${line.slice(0, 300)}`),
  ]);
}
