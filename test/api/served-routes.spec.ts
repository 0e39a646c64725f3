import { endpoints } from '#shared/endpoints';
import { startApi, type Api } from './start-api';

/** The matrix asks what stands in the list of endpoints; here it is what the server really answers to that is compared with the list. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

/** What is no endpoint: how the server does, what it understands, and the page of a machine without a mail server. */
const besides = ['get /healthz', 'get /readyz', 'get /api/openapi.json', 'get /api/reference', 'get /development/mail'];

interface Layer {
  readonly route?: { readonly path: string; readonly methods: Readonly<Record<string, boolean>> };
  readonly handle: { readonly stack?: readonly Layer[] };
}

/** Every route, however deep its router stands in others. */
const routesOf = (stack: readonly Layer[]): string[] =>
  stack.flatMap(({ route, handle }) => [
    ...Object.keys(route?.methods ?? {}).map((method) => `${method} ${route?.path}`),
    ...routesOf(route ? [] : (handle.stack ?? [])),
  ]);

test('every route is an endpoint of the list or one of a few named ones, and every endpoint has its route, once', () => {
  const listed = endpoints.map(({ method, path }) => `${method} ${path}`);
  const { stack } = api.app.web.express.router as unknown as { readonly stack: readonly Layer[] };
  expect(routesOf(stack).toSorted()).toEqual([...listed, ...besides].toSorted());
});
