import type { AnswerOf, Endpoint } from '#shared/actor/endpoint';
import type { FileAnswer, PreparedAnswer } from './answer';
import type { Call } from './call';

/** What a handler gives back: the endpoint's answer, a file, JSON kept ready, or nothing where the endpoint declares no answer. */
export type Outcome<E extends Endpoint> = AnswerOf<E> | FileAnswer | PreparedAnswer | void;

export type Handler<E extends Endpoint> = (call: Call<E>) => Promise<Outcome<E>>;

/** An endpoint with the handler that serves it. `current` presents the row as it stands now when a stale version is refused. */
export interface Route {
  readonly endpoint: Endpoint;
  readonly handle: Handler<Endpoint>;
  readonly current?: (row: never, call: Call) => unknown;
}

/**
 * Serves an endpoint with a handler. Around it stand, in this order: forgery check, session, roles, parsing, Idempotency-Key, one
 * transaction for whatever changes something, and the check of the answer against the schema of its audience.
 */
export const mount = <E extends Endpoint>(endpoint: E, handle: Handler<E>, current?: Route['current']): Route => ({
  endpoint,
  handle: handle as unknown as Handler<Endpoint>,
  ...(current ? { current } : {}),
});
