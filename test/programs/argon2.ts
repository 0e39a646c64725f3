import * as argon2 from '../../node_modules/@node-rs/argon2';

const hashes = new Map<string, Promise<string>>();
const fitting = new Set<string>();

const keyOf = (...parts: unknown[]): string => JSON.stringify(parts);

/**
 * Stands in for `@node-rs/argon2` in tests on a database (`jest.config.cjs`), where hundreds of people have one password: it is hashed
 * once, as strongly as ever. A password that does not fit is looked at anew each time, for how long that takes is itself tested.
 */
export function hash(password: string, options: argon2.Options): Promise<string> {
  const key = keyOf(password, options);
  const known = hashes.get(key) ?? argon2.hash(password, options);
  hashes.set(key, known);
  return known;
}

export async function verify(kept: string, password: string): Promise<boolean> {
  const key = keyOf(kept, password);
  const fits = fitting.has(key) || (await argon2.verify(kept, password));
  if (fits) fitting.add(key);
  return fits;
}
