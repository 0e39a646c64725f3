import 'express-session';

declare module 'express-session' {
  interface SessionData {
    /** The token unsafe requests must carry. */
    forgeryToken: string;
    /** The public handle of the session, by which its owner may end it. */
    handle: string;
    agent: string;
    /** The client's visit, if one was begun. */
    visit: { workshopId: string; accessId: string };
    passport: { user?: { accountId: string; membershipId?: string } };
    /** When somebody signed in, by which the session ends whatever its id: as the store read it, or taken over from the session before. */
    begunAt: number;
    /** When the session was last marked as used, as the store read it. */
    seenAt: number;
    /** Set for a request that nobody's hand made (polling): it does not prolong the session. */
    unattended: boolean;
    /** Set once it was written, in this request. */
    isWritten: boolean;
  }
}
