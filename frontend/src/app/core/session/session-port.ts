import { InjectionToken } from '@angular/core';

/** What the core asks of `accounts`, which comes later in the list of features; `app-config.ts` supplies it. */
export interface SessionPort {
  /** Asks the server who is signed in and puts the answer into `Session`. */
  read(): Promise<void>;
  /** Ends the session and forgets everything the page knew. */
  signOut(): Promise<void>;
  /** Goes to another workshop of the same person, with a fresh page. */
  enter(membershipId: string): Promise<void>;
  /** Gets a working session back for the same person, asking for the password over the page if it must; false when they would rather not. */
  signInAgain(): Promise<boolean>;
}

export const SESSION_PORT = new InjectionToken<SessionPort>('SESSION_PORT');
