import type { Actor } from '#shared/actor/actor';
import type { ClientActor } from '#shared/actor/client-actor';
import type { ValueFormats } from '#shared/words/say';

/** What a session remembers of a person: who, and as whom of which workshop. */
export interface Identity {
  readonly accountId: string;
  readonly membershipId?: string;
}

/** A person signed in, in a workshop or in none. */
export interface Person {
  readonly accountId: string;
  readonly email: string;
  readonly name: string;
}

export interface SignedIn {
  readonly person: Person;
  readonly actor: Actor | undefined;
}

/** The port through which sessions learn who somebody is; `accounts` supplies it. */
export interface Identities {
  /** Who a session speaks for now, or nobody if the account or the membership was ended since. */
  load(identity: Identity): Promise<SignedIn | undefined>;
  /** How figures are written in a workshop. */
  formatsOf(workshopId: string): Promise<ValueFormats>;
  /** The identity behind an e-mail address and its password, or nobody; refuses as too many. */
  verify(entry: { email: string; password: string; address: string }): Promise<Identity | undefined>;
}

/** What a session remembers of a client's visit; whether it still holds is asked at every request. */
export interface Visit {
  readonly workshopId: string;
  readonly accessId: string;
}

/** The port through which sessions learn which client a visit speaks for; `agreements` supplies it. */
export interface Visits {
  /** The client, or nobody if the access has ended or was taken back. */
  load(visit: Visit): Promise<ClientActor | undefined>;
}

/** What somebody signs in with. */
export interface Credentials {
  readonly email: string;
  readonly password: string;
}

/** What a handler may do with the session of its request. */
export interface SessionControl {
  /** The public handle of this session, undefined until somebody signed in. */
  readonly id: string | undefined;
  /** The token that unsafe requests of this session carry. */
  readonly forgeryToken: string;
  /** Writes a session that has just begun, so that nobody is given a token of one that is not kept. */
  keep(): Promise<void>;
  /** Checks e-mail and password, read by their schema, and signs in under a new session id; answers nobody when they do not fit. */
  signInByPassword(entered: Credentials): Promise<Identity | undefined>;
  /** Signs in under a new session id; its time begins anew. */
  signIn(identity: Identity): Promise<void>;
  /** Goes on in another workshop under a new session id; its time goes on too. */
  enter(identity: Identity): Promise<void>;
  /** Begins a client's visit under a new session id; whoever is signed in stays so. */
  beginVisit(visit: Visit): Promise<void>;
  signOut(): Promise<void>;
}
