import { endpoints } from '#shared/endpoints';
import { openApiOf } from './openapi';

type Json = Record<string, unknown>;
const document = JSON.parse(JSON.stringify(openApiOf(endpoints, 'bolewright'))) as {
  openapi: string;
  paths: Record<
    string,
    Record<
      string,
      { operationId: string; parameters: { name: string; in: string; required: boolean }[]; responses: Json }
    >
  >;
  components: { schemas: Json };
};
const operations = Object.entries(document.paths).flatMap(([path, methods]) =>
  Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
);

function* refsOf(value: unknown): Generator<string> {
  if (typeof value !== 'object' || value === null) return;
  for (const [name, inner] of Object.entries(value)) {
    if (name === '$ref' && typeof inner === 'string') yield inner;
    else yield* refsOf(inner);
  }
}

test('it is a document of OpenAPI 3.1 with every endpoint once', () => {
  expect(document.openapi).toBe('3.1.0');
  expect(operations.map(({ operation }) => operation.operationId).sort()).toEqual(
    endpoints.map(({ name }) => name).sort(),
  );
});

test('every part of a path is described as a parameter of it', () => {
  for (const { path, operation } of operations) {
    const named = [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name);
    const described = operation.parameters.filter((one) => one.in === 'path');
    expect(described.map(({ name }) => name).sort()).toEqual(named.sort());
    expect(described.every(({ required }) => required)).toBe(true);
  }
});

test('every reference leads somewhere in the document', () => {
  for (const ref of refsOf(document)) {
    const found = ref
      .split('/')
      .slice(1)
      .reduce<unknown>((at, name) => (at as Json | undefined)?.[name], document);
    expect([ref, typeof found]).toEqual([ref, 'object']);
  }
});

test('every operation says what it answers and how it refuses', () => {
  for (const { operation } of operations) {
    expect(Object.keys(operation.responses).filter((status) => status.startsWith('2'))).toHaveLength(1);
    expect(operation.responses).toHaveProperty('default');
  }
});

test('what changes something asks for the token, what is versioned for the version, what is done once for the key', () => {
  const headersOf = (name: string) =>
    operations
      .find(({ operation }) => operation.operationId === name)
      ?.operation.parameters.filter((one) => one.in === 'header')
      .map((one) => one.name);
  expect(headersOf('changeWorkshop')).toEqual(['X-CSRF-Token', 'If-Match']);
  expect(headersOf('invite')).toEqual(['X-CSRF-Token', 'Idempotency-Key']);
  expect(headersOf('readWorkshop')).toEqual([]);
});
