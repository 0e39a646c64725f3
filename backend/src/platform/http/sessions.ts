import { randomBytes, randomUUID } from 'node:crypto';
import type { Request, RequestHandler } from 'express';
import session from 'express-session';
import { Passport } from 'passport';
import { Strategy as LocalStrategy } from 'passport-local';
import { Rejection } from '#shared/problems/rejection';
import type { Config } from '../config/config';
import { newSessionId } from '../session/new-session-id';
import { markUnattended, type SessionStore } from '../session/session-store';
import type {
  Credentials,
  Identities,
  Identity,
  SessionControl,
  SignedIn,
  Visit,
  Visits,
} from '../session/session-control';

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
  request.session.forgeryToken ??= request.replaced?.forgeryToken ?? randomBytes(32).toString('base64url');
  request.session.handle ??= request.replaced?.handle ?? randomUUID();
  request.session.agent ??= (request.get('user-agent') ?? '').slice(0, 200);
};

/** Notes the session that another takes the place of, once: a transaction that is repeated finds the other one in its request. */
const goOnFrom = (request: Request): { readonly id: string } =>
  (request.replaced ??= {
    id: request.sessionID,
    forgeryToken: request.session.forgeryToken,
    handle: request.session.handle,
  });

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
      keep: () => this.keep(request),
      signIn,
      enter: (identity) => this.enter(request, identity),
      beginVisit: (visit) => this.beginVisit(request, visit),
      signInByPassword: (entered) => this.byPassword(request, entered),
      signOut: () => this.signOut(request),
    };
  }

  /** Under a new id; the token stays for the same person, whose page still holds it. */
  private async signIn(request: Request, identity: Identity): Promise<void> {
    if (request.session.passport?.user?.accountId === identity.accountId) goOnFrom(request);
    await new Promise<void>((resolve, reject) => {
      request.logIn(identity, (error) => (error ? reject(error as Error) : resolve()));
    });
    nameCaller(request, await this.identities.load(identity));
  }

  /** Nobody has proved anew who they are, so the session ends when it would have ended. */
  private async enter(request: Request, identity: Identity): Promise<void> {
    const { begunAt } = request.session;
    if (begunAt !== undefined) request.begunAtToKeep = begunAt;
    await this.endReplaced(request);
    await this.signIn(request, identity);
  }

  /** Refused where the session has ended meanwhile: who signed out stays signed out. */
  private async endReplaced(request: Request): Promise<void> {
    const { id } = goOnFrom(request);
    if (!(await this.store.end(id))) throw new Rejection('signed-out', 'problem-signed-out');
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
    if (passport?.user) await this.endReplaced(request);
    await new Promise<void>((resolve, reject) => {
      request.session.regenerate((error) => (error ? reject(error as Error) : resolve()));
    });
    Object.assign(request.session, { visit, ...(passport?.user ? { passport, forgeryToken, handle, begunAt } : {}) });
    await this.keep(request);
  }

  private async keep(request: Request): Promise<void> {
    beginSession(request);
    if (request.session.seenAt !== undefined) return;
    await new Promise<void>((resolve, reject) => {
      request.session.save((error: Error | undefined) => (error ? reject(error) : resolve()));
    });
  }

  /** What took the session's place meanwhile bears the same handle, and is looked for only when the session's own row is free. */
  private async signOut(request: Request): Promise<void> {
    const { handle = '' } = request.session;
    request.res?.clearCookie(cookieName(this.config), {
      path: '/',
      httpOnly: true,
      sameSite: 'lax',
      secure: isPublic(this.config),
    });
    await new Promise<void>((resolve, reject) => {
      request.session.destroy((error) => (error ? reject(error as Error) : resolve()));
    });
    await this.store.endOfHandle(handle);
  }

  /** What passport reads is what the schema made of the body: one account has one spelling, which its throttle counts. */
  private byPassword(request: Request, entered: Credentials): Promise<Identity | undefined> {
    request.body = entered;
    return new Promise((resolve, reject) => {
      const decide = (error: Error | null, identity: Identity | false): void => {
        if (error) return reject(error);
        if (!identity) return resolve(undefined);
        this.signIn(request, identity).then(() => resolve(identity), reject);
      };
      const strategy = this.passport.authenticate('local', decide) as RequestHandler;
      void strategy(request, request.res!, reject);
    });
  }
}
