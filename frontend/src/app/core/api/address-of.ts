import type { Endpoint } from '#shared/actor/endpoint';
import type { AnyParts } from './call-parts';

const isPresent = (value: unknown): boolean => value !== undefined && value !== null && value !== '';

/** The address of an endpoint with its parameters and query written in; it serves links and pictures too. */
export function addressOf(
  { path: pattern }: Pick<Endpoint, 'path'>,
  parts: Pick<AnyParts, 'params' | 'query'> = {},
): string {
  const path = pattern.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(parts.params?.[name])));
  const query = Object.entries(parts.query ?? {}).filter(([, value]) => isPresent(value));
  const search = new URLSearchParams(query.map(([name, value]) => [name, String(value)])).toString();
  return search ? `${path}?${search}` : path;
}
