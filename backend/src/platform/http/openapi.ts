import * as z from 'zod';
import type { Endpoint } from '#shared/actor/endpoint';
import { audiences } from '#shared/actor/role';
import { problemSchema } from '#shared/problems/problem-schema';

type Json = Record<string, unknown>;

const schemaOf = (schema: z.ZodType, io: 'input' | 'output'): Json =>
  z.toJSONSchema(schema, { io, unrepresentable: 'any', target: 'draft-2020-12' });

const pathOf = (endpoint: Endpoint): string => endpoint.path.replace(/:(\w+)/g, '{$1}');

function parametersOf(endpoint: Endpoint): Json[] {
  const fields = (schema: z.ZodObject | undefined, place: string): Json[] =>
    Object.entries(schema?.shape ?? {}).map(([name, field]) => ({
      name,
      in: place,
      required: place === 'path' || !(field as z.ZodType).safeParse(undefined).success,
      schema: schemaOf(field as z.ZodType, 'input'),
    }));
  const header = (name: string, description: string): Json => ({
    name,
    in: 'header',
    required: true,
    description,
    schema: { type: 'string' },
  });
  return [
    ...fields(endpoint.params, 'path'),
    ...fields(endpoint.query, 'query'),
    ...(endpoint.method === 'get' || endpoint.signature
      ? []
      : [header('X-CSRF-Token', 'The token of GET /api/session.')]),
    ...(endpoint.signature ? [header(endpoint.signature, 'The signature of the body by whoever sends it.')] : []),
    ...(endpoint.versioned ? [header('If-Match', 'The version seen, as the ETag gave it.')] : []),
    ...(endpoint.idempotent ? [header('Idempotency-Key', 'A random key of 16 to 80 characters; kept for a day.')] : []),
  ];
}

function bodyOf(endpoint: Endpoint): Json | undefined {
  if (endpoint.upload) {
    const file = {
      type: 'object',
      properties: { [endpoint.upload]: { type: 'string', format: 'binary' } },
      required: [endpoint.upload],
    };
    const fields = endpoint.body ? [schemaOf(endpoint.body, 'input')] : [];
    return {
      required: true,
      content: { 'multipart/form-data': { schema: fields.length ? { allOf: [file, ...fields] } : file } },
    };
  }
  return (
    endpoint.body && { required: true, content: { 'application/json': { schema: schemaOf(endpoint.body, 'input') } } }
  );
}

function answerOf(endpoint: Endpoint): Json {
  if (endpoint.media)
    return {
      '200': {
        description: 'The file.',
        content: { [endpoint.media]: { schema: { type: 'string', format: 'binary' } } },
      },
    };
  const known = audiences.flatMap((audience) => {
    const schema = endpoint.answers[audience];
    return schema ? [{ audience, schema }] : [];
  });
  const distinct = known.filter(({ schema }, at) => known.findIndex((one) => one.schema === schema) === at);
  if (distinct.length === 0) return { '204': { description: 'Done.' } };
  const described = distinct.map(({ schema, audience }) => ({
    ...schemaOf(schema, 'output'),
    title: `for ${audience}`,
  }));
  return {
    '200': {
      description: 'The answer.',
      content: { 'application/json': { schema: described.length === 1 ? described[0] : { oneOf: described } } },
    },
  };
}

const callersOf = ({ callers }: Endpoint): string => (typeof callers === 'string' ? callers : callers.join(', '));

const operationOf = (endpoint: Endpoint): Json => ({
  operationId: endpoint.name,
  summary: endpoint.summary,
  description: `Callers: ${callersOf(endpoint)}.`,
  security: endpoint.callers === 'anyone' ? [] : [{ session: [] }],
  parameters: parametersOf(endpoint),
  ...(bodyOf(endpoint) ? { requestBody: bodyOf(endpoint) } : {}),
  responses: {
    ...answerOf(endpoint),
    default: {
      description: 'Refused; all complaints at once.',
      content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
    },
  },
});

/** The OpenAPI 3.1 document of a list of endpoints, made from the very schemas that parse requests and answers. */
export function openApiOf(endpoints: readonly Endpoint[], cookie: string): Json {
  const paths: Record<string, Json> = {};
  for (const endpoint of endpoints) (paths[pathOf(endpoint)] ??= {})[endpoint.method] = operationOf(endpoint);
  return {
    openapi: '3.1.0',
    info: { title: 'Bolewright', version: '1' },
    paths,
    components: {
      schemas: { Problem: schemaOf(problemSchema, 'output') },
      securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: cookie } },
    },
  };
}
