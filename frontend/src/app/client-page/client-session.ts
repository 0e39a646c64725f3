import { Injectable, inject } from '@angular/core';
import { Api } from '../core/api/api';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { Session } from '../core/session/session';
import type { SessionPort } from '../core/session/session-port';
import { openingCalls } from './opening-calls';

/** The session of a visit: it has a token for what changes something, and nobody who is signed in. */
@Injectable({ providedIn: 'root' })
export class ClientSession implements SessionPort {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly notices = inject(Notices);

  async read(): Promise<void> {
    try {
      const { token } = await this.api.call(openingCalls.readSession, {});
      this.session.put(undefined, token);
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.notices.complain(error.message);
    }
  }

  /** A visit ends with its link; there is nothing to sign out of. */
  signOut(): Promise<void> {
    return Promise.resolve();
  }

  enter(): Promise<void> {
    return Promise.resolve();
  }

  signInAgain(): Promise<boolean> {
    return Promise.resolve(false);
  }
}
