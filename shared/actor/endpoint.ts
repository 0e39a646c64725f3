import type * as z from 'zod';
import type { Audience, Role } from '#shared/actor/role';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** Who may call: anybody, any signed-in person (with or without a workshop), a client on a visit, or the named roles. */
export type Callers = 'anyone' | 'signed-in' | 'client' | readonly [Role, ...Role[]];

/** The answer's closed schema for each audience that may receive it. */
export type Answers = Partial<Readonly<Record<Audience, z.ZodType>>>;

/**
 * One request as one value: the server mounts it, the browser calls it, both parse with it, and the guard, the tests and the
 * OpenAPI document read it. `idempotent` asks for an Idempotency-Key, `versioned` for If-Match.
 */
export interface Endpoint {
  readonly name: string;
  readonly summary: string;
  readonly method: Method;
  readonly path: `/api/${string}`;
  readonly callers: Callers;
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly body?: z.ZodType;
  readonly answers: Answers;
  /** What is sent: JSON by default, else a file of this media type. */
  readonly media?: string;
  /** The body is a file upload (multipart) with this field name. */
  readonly upload?: string;
  /** The sender signs the bytes of the body, in the header of this name: there is no session and no token. */
  readonly signature?: string;
  readonly idempotent?: boolean;
  readonly versioned?: boolean;
  /** How many are served at once, where the work is costly; the others wait their turn before anything is taken for them. */
  readonly atOnce?: number;
  /** It takes steps that are each a transaction of their own, and holds nothing while it asks a service outside between them. */
  readonly inSteps?: boolean;
}

type Schemas = 'params' | 'query' | 'body' | 'answers';

/**
 * An endpoint without its schemas, for a page that must be there at once: the server has checked the answer by the endpoint itself, and what
 * it sends is taken at its word.
 */
export type BareEndpoint<E extends Endpoint = Endpoint> = Omit<E, Schemas> & { readonly bareOf?: E };

/** Declares what is left of an endpoint when its schemas stay away, keeping the types of its parts and its answer. */
export const bareEndpoint = <E extends Endpoint>(value: Omit<E, Schemas>): BareEndpoint<E> => value;

/** Declares an endpoint, keeping the exact types of its parts. */
export const endpoint = <const E extends Endpoint>(value: E): E => value;

/** The same answer for every audience. */
export const sameForAll = <S extends z.ZodType>(schema: S) => ({ cost: schema, price: schema, bench: schema }) as const;

/** The same answer for those who see money. */
export const sameForPriced = <S extends z.ZodType>(schema: S) => ({ cost: schema, price: schema }) as const;

type Parsed<S> = S extends z.ZodType ? z.infer<S> : undefined;
export type ParamsOf<E extends Endpoint> = Parsed<E['params']>;
export type QueryOf<E extends Endpoint> = Parsed<E['query']>;
export type BodyOf<E extends Endpoint> = Parsed<E['body']>;
export type AnswerOf<E extends Endpoint> = Parsed<Exclude<E['answers'][keyof E['answers']], undefined>>;
