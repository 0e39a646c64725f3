import type {} from 'express-serve-static-core';

declare module 'express-serve-static-core' {
  interface Request {
    requestId: string;
    workshopId?: string;
    accountId?: string;
    /** The forgery token that the next session of the same person goes on with. */
    tokenToKeep?: string;
  }
}
