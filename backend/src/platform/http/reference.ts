import { Router } from 'express';
import type { Endpoint } from '#shared/actor/endpoint';
import { openApiOf } from './openapi';
import { escaped, sendPlainPage } from './plain-page';

const callersOf = ({ callers }: Endpoint): string => (typeof callers === 'string' ? callers : callers.join(', '));

const row = (endpoint: Endpoint): string =>
  `<tr><td><code>${endpoint.method.toUpperCase()} ${escaped(endpoint.path)}</code></td><td>${escaped(endpoint.summary)}</td><td>${callersOf(endpoint)}</td></tr>`;

const head = '<tr><th scope="col">Request</th><th scope="col">What it does</th><th scope="col">Who may</th></tr>';

/** The requests the server understands: as OpenAPI for machines, as a table for people. */
export function reference(endpoints: readonly Endpoint[], cookie: string): Router {
  const document = JSON.stringify(openApiOf(endpoints, cookie));
  const page = `<p>The same as a document of OpenAPI 3.1: <a href="/api/openapi.json">openapi.json</a></p><table>${head}${endpoints.map(row).join('')}</table>`;
  return Router()
    .get('/api/openapi.json', (_request, response) => void response.type('json').send(document))
    .get('/api/reference', (_request, response) => sendPlainPage(response, 'Requests', page));
}
