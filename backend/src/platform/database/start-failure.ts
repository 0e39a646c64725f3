import { AccessDeniedError, ConnectionError } from 'sequelize';

/** What whoever starts a server is told of a database that lets nobody in; any other error stays what it is. No password is named. */
export function startFailure(error: unknown, url: string): unknown {
  if (!(error instanceof ConnectionError)) return error;
  const { host, pathname } = new URL(url);
  if (error instanceof AccessDeniedError)
    return new Error(`The database ${pathname.slice(1)} at ${host} refuses this account; look at DATABASE_URL.`);
  return new Error(`No database answers at ${host}; is it running, and is DATABASE_URL right? (${error.message})`);
}
