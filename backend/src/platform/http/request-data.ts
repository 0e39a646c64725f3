import type { ClientActor } from '#shared/actor/client-actor';
import type {} from 'express-serve-static-core';

declare module 'express-serve-static-core' {
  interface Request {
    requestId: string;
    workshopId?: string;
    accountId?: string;
    /** The client on a visit, if the session has one that still holds. (`client` is Node's own word for the socket.) */
    visitingClient?: ClientActor | undefined;
    /** The session whose place another takes: the same person goes on with its token and its handle. */
    replaced?: { readonly id: string; readonly forgeryToken: string | undefined; readonly handle: string | undefined };
    /** When somebody signed in, which the next session of theirs goes on with. */
    begunAtToKeep?: number;
  }
}
