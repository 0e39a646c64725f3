import type {} from 'express-serve-static-core';

declare module 'express-serve-static-core' {
  interface Request {
    requestId: string;
    workshopId?: string;
    accountId?: string;
  }
}
