import type * as z from 'zod';
import type { AnswerOf, Endpoint } from '#shared/actor/endpoint';

type Part<Name extends string, S> = S extends z.ZodType ? { readonly [K in Name]: z.input<S> } : unknown;
type Upload<E extends Endpoint> = E['upload'] extends string ? { readonly file: File } : unknown;
type Versioned<E extends Endpoint> = E['versioned'] extends true ? { readonly version: number } : unknown;
type Idempotent<E extends Endpoint> = E['idempotent'] extends true ? { readonly idempotencyKey: string } : unknown;

/** What every call may say besides: when to stop waiting, and that no hand made it (polling does not prolong a session). */
export interface CallManner {
  readonly signal?: AbortSignal;
  readonly unattended?: boolean;
}

/** What one call of an endpoint must bring along: parameters, query, body, file, and the version it was made from. */
export type CallParts<E extends Endpoint> = Part<'params', E['params']> &
  Part<'query', E['query']> &
  Part<'body', E['body']> &
  Upload<E> &
  Versioned<E> &
  Idempotent<E> &
  CallManner;

type Parsed<E extends Endpoint> = [AnswerOf<E>] extends [never] ? undefined : AnswerOf<E>;

/** What comes back: the parsed answer, a file where the endpoint sends one, nothing where it declares none. */
export type CallAnswer<E extends Endpoint> = E['media'] extends string ? Blob : Parsed<E>;

/** The same parts with their names only, for the code that puts a request together. */
export interface AnyParts extends CallManner {
  readonly params?: Readonly<Record<string, unknown>>;
  readonly query?: Readonly<Record<string, unknown>>;
  readonly body?: unknown;
  readonly file?: File;
  readonly version?: number;
  readonly idempotencyKey?: string;
}
