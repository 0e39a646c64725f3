import type { Request } from 'express';
import type { Endpoint } from '#shared/actor/endpoint';
import type { Complaint } from '#shared/problems/complaint';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { Rejection } from '#shared/problems/rejection';
import * as z from 'zod';
import { unkeepableTexts } from './unkeepable-texts';

const nothing = z.strictObject({});
type Part = 'params' | 'query' | 'body';

export interface Parsed {
  readonly params: unknown;
  readonly query: unknown;
  readonly body: unknown;
}

/** A body is an object; an endpoint without one accepts none. */
const schemaOf = (endpoint: Endpoint, part: Part): z.ZodType => {
  const schema = endpoint[part];
  return schema instanceof z.ZodObject ? schema.strict() : (schema ?? nothing);
};

const sent = (request: Request, part: Part): unknown => (Buffer.isBuffer(request[part]) ? {} : (request[part] ?? {}));

/** Of hundreds of thousands of wrong entries a schema cannot even make a list: the stack ends first. */
function readWhole(schema: z.ZodType, value: unknown): z.ZodSafeParseResult<unknown> {
  try {
    return readBy(schema, value);
  } catch (error) {
    if (error instanceof RangeError) throw new Rejection('invalid', 'problem-invalid');
    throw error;
  }
}

const placeOf = ({ path }: Complaint): string => path.join('\n');

/** Parses the whole request and refuses it with all complaints at once; those of the body stand at their field's own path. */
export function parseRequest(endpoint: Endpoint, request: Request): Parsed {
  const unkeepable = unkeepableTexts(request.body);
  const complaints: Complaint[] = [];
  const parse = (part: Part): unknown => {
    const read = readWhole(schemaOf(endpoint, part), sent(request, part));
    if (read.success) return read.data;
    const at = part === 'body' ? [] : [part];
    for (const complaint of complaintsOf(read.error))
      complaints.push({ ...complaint, path: [...at, ...complaint.path] });
    return undefined;
  };
  const parsed = { params: parse('params'), query: parse('query'), body: parse('body') };
  const told = new Set(complaints.map(placeOf));
  complaints.push(...unkeepable.filter((complaint) => !told.has(placeOf(complaint))));
  if (complaints.length > 0) throw new Rejection('invalid', 'problem-invalid', { complaints });
  return parsed;
}

/** The version of an If-Match header as our ETags write it; refuses a versioned request without one. */
export function versionSeen(endpoint: Endpoint, request: Request): number {
  if (!endpoint.versioned) return 0;
  const version = /^"(\d{1,9})"$/.exec(request.get('if-match') ?? '')?.[1];
  if (version === undefined) throw new Rejection('invalid', 'problem-no-version');
  return Number(version);
}
