import { HttpHeaders, HttpRequest } from '@angular/common/http';
import type { BareEndpoint } from '#shared/actor/endpoint';
import { addressOf } from './address-of';
import type { AnyParts } from './call-parts';

/** The headers the server reads; `forgery.ts`, `parse.ts` and `sessions.ts` of its platform are their other side. */
const headerNames = {
  token: 'x-csrf-token',
  version: 'if-match',
  key: 'idempotency-key',
  unattended: 'x-unattended',
} as const;

/** The session's token where something changes, the version seen, the key of a thing done once. */
function headersOf(endpoint: BareEndpoint, parts: AnyParts, token: string): Record<string, string> {
  return {
    ...(endpoint.method === 'get' ? {} : { [headerNames.token]: token }),
    ...(parts.version === undefined ? {} : { [headerNames.version]: `"${parts.version}"` }),
    ...(parts.idempotencyKey === undefined ? {} : { [headerNames.key]: parts.idempotencyKey }),
    ...(parts.unattended ? { [headerNames.unattended]: '1' } : {}),
  };
}

/** JSON as it is, or a form with the file and the plain fields beside it. */
function bodyOf(endpoint: BareEndpoint, { body, file }: AnyParts): unknown {
  if (!endpoint.upload || !file) return body ?? null;
  const form = new FormData();
  for (const [name, value] of Object.entries((body ?? {}) as Record<string, string | number>))
    form.append(name, String(value));
  form.append(endpoint.upload, file, file.name);
  return form;
}

/** One call of an endpoint as the request that is sent. */
export function callRequest(endpoint: BareEndpoint, parts: AnyParts, token: string): HttpRequest<unknown> {
  return new HttpRequest<unknown>(endpoint.method.toUpperCase(), addressOf(endpoint, parts), bodyOf(endpoint, parts), {
    headers: new HttpHeaders(headersOf(endpoint, parts, token)),
    responseType: endpoint.media ? 'blob' : 'json',
  });
}
