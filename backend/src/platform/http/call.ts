import type { Actor } from '#shared/actor/actor';
import type { ClientActor } from '#shared/actor/client-actor';
import type { BodyOf, Endpoint, ParamsOf, QueryOf } from '#shared/actor/endpoint';
import type { SessionControl, Person } from '../session/session-control';

/** A file as it came in: its bytes and the name its sender gave it. Nothing about it has been checked yet. */
export interface Upload {
  readonly name: string;
  readonly bytes: Buffer;
}

/** A body whose sender signed it: not a word of it is believed before the signature has been checked. */
export interface SignedBody {
  readonly bytes: Buffer;
  readonly signature: string;
}

/** Where a request came from, for limits and for the log. */
export interface Caller {
  readonly requestId: string;
  readonly address: string;
  readonly agent: string;
}

type Known<E extends Endpoint, Always, Never> = E['callers'] extends 'anyone' ? Never : Always;
type InWorkshop<E extends Endpoint> = E['callers'] extends string ? Actor | undefined : Actor;

/** One request to an endpoint: all of it parsed, the caller's role already checked. */
export interface Call<E extends Endpoint = Endpoint> {
  readonly params: ParamsOf<E>;
  readonly query: QueryOf<E>;
  readonly body: BodyOf<E>;
  readonly person: Known<E, Person, Person | undefined>;
  readonly actor: InWorkshop<E>;
  /** The client on a visit, where the endpoint is for one. */
  readonly client: E['callers'] extends 'client' ? ClientActor : ClientActor | undefined;
  /** The version the caller saw (If-Match); 0 for an endpoint that is not versioned. */
  readonly version: number;
  readonly upload: Upload | undefined;
  readonly signed: SignedBody | undefined;
  readonly session: SessionControl;
  readonly from: Caller;
}
