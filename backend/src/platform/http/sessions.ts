import { randomBytes, randomUUID } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import { Passport } from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import type { Config } from '../config/config';
import { newSessionId } from '../session/new-session-id';
import { markUnattended, type SessionStore } from '../session/session-store';
import type { Identities, Identity, SessionControl, SignedIn, Visit, Visits } from '../session/session-control';

/** Requests that a page sends on its own, such as polling, carry this header and do not prolong a session. */
export const unattendedHeader = 'x-unattended';

export const isPublic = (config: Config): boolean => config.publicUrl?.protocol === 'https:';
export const cookieName = (config: Config): string => (isPublic(config) ? '__Host-bolewright' : 'bolewright');

export const signedInOf = (request: Request): SignedIn | undefined => request.user as SignedIn | undefined;

/** For the log: whose request this is. */
export function nameCaller(request: Request, signedIn: SignedIn | undefined): void {
  if (!signedIn) return;
  request.accountId = signedIn.person.accountId;
  request.workshopId = signedIn.actor?.workshopId;
}

const beginSession = (request: Request): void => {
  if (request.begunAtToKeep !== undefined) request.session.begunAt = request.begunAtToKeep;
  request.session.forgeryToken ??= request.tokenToKeep ?? randomBytes(32).toString('base64url');
  request.session.handle ??= randomUUID();
  request.session.agent ??= (request.get('user-agent') ?? '').slice(0, 200);
};

/** Reads the session of a request and who it speaks for. */
export class Sessions {
  private readonly passport = new Passport();

  constructor(
    private readonly config: Config,
    private readonly store: SessionStore,
    private readonly identities: Identities,
    private readonly visits: Visits,
  ) {
    this.passport.serializeUser(
      (request: Request, user: Express.User, done: (error: unknown, user: Express.User) => void) => {
        beginSession(request);
        done(null, user);
      },
    );
    this.passport.deserializeUser((identity: Identity, done) => {
      identities.load(identity).then((signedIn) => done(null, (signedIn as Express.User | undefined) ?? false), done);
    });
    this.passport.use(
      new LocalStrategy({ usernameField: 'email', passReqToCallback: true }, (request, email, password, done) => {
        identities
          .verify({ email, password, address: request.ip ?? '' })
          .then((identity) => done(null, identity ?? false), done);
      }),
    );
  }

  middleware(): RequestHandler[] {
    const cookie = { httpOnly: true, sameSite: 'lax', secure: isPublic(this.config), path: '/' } as const;
    const unattended: RequestHandler = (request, _response, next) => {
      if (request.get(unattendedHeader)) markUnattended(request.session);
      next();
    };
    return [
      session({
        name: cookieName(this.config),
        secret: this.config.sessionSecret,
        store: this.store,
        cookie,
        resave: false,
        saveUninitialized: false,
        genid: newSessionId,
      }),
      unattended,
      this.passport.session() as RequestHandler,
      this.visitRead(),
    ];
  }

  control(request: Request): SessionControl {
    const signIn = (identity: Identity) => this.signIn(request, identity);
    return {
      get id() {
        return request.session.passport?.user ? request.session.handle : undefined;
      },
      get forgeryToken() {
        beginSession(request);
        return request.session.forgeryToken ?? '';
      },
      signIn,
      enter: (identity) => this.enter(request, identity),
      beginVisit: (visit) => this.beginVisit(request, visit),
      signInByPassword: () => this.byPassword(request, signIn),
      signOut: () => this.signOut(request),
    };
  }

  /** Under a new id; the token stays for the same person, whose page still holds it. */
  private async signIn(request: Request, identity: Identity): Promise<void> {
    const { passport, forgeryToken } = request.session;
    if (passport?.user?.accountId === identity.accountId && forgeryToken) request.tokenToKeep = forgeryToken;
    await new Promise<void>((resolve, reject) => {
      request.logIn(identity, (error) => (error ? reject(error as Error) : resolve()));
    });
    nameCaller(request, await this.identities.load(identity));
  }

  /** Nobody has proved anew who they are, so the session ends when it would have ended. */
  private async enter(request: Request, identity: Identity): Promise<void> {
    const { begunAt } = request.session;
    if (begunAt !== undefined) request.begunAtToKeep = begunAt;
    await this.signIn(request, identity);
  }

  private visitRead(): RequestHandler {
    return async (request, _response, next) => {
      const { visit } = request.session;
      if (visit) request.visitingClient = await this.visits.load(visit);
      next();
    };
  }

  /** Under a new id, so that nobody else knows the session a client reads in. */
  private async beginVisit(request: Request, visit: Visit): Promise<void> {
    const { passport, forgeryToken, handle, begunAt } = request.session;
    await new Promise<void>((resolve, reject) => {
      request.session.regenerate((error) => (error ? reject(error as Error) : resolve()));
    });
    Object.assign(request.session, { visit, ...(passport?.user ? { passport, forgeryToken, handle, begunAt } : {}) });
    beginSession(request);
    await new Promise<void>((resolve, reject) => {
      request.session.save((error: Error | undefined) => (error ? reject(error) : resolve()));
    });
  }

  private signOut(request: Request): Promise<void> {
    request.res?.clearCookie(cookieName(this.config), {
      path: '/',
      httpOnly: true,
      sameSite: 'lax',
      secure: isPublic(this.config),
    });
    return new Promise((resolve, reject) => {
      request.session.destroy((error) => (error ? reject(error as Error) : resolve()));
    });
  }

  private byPassword(request: Request, signIn: (identity: Identity) => Promise<void>): Promise<Identity | undefined> {
    return new Promise((resolve, reject) => {
      const decide = (error: Error | null, identity: Identity | false): void => {
        if (error) return reject(error);
        if (!identity) return resolve(undefined);
        signIn(identity).then(() => resolve(identity), reject);
      };
      const strategy = this.passport.authenticate('local', decide) as RequestHandler;
      void strategy(request, request.res!, reject);
    });
  }
}
