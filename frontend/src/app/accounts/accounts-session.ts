import { Injectable, Injector, inject } from '@angular/core';
import { enterWorkshop, readSession, signOut } from '#shared/accounts/session-endpoints';
import type { SessionAnswer } from '#shared/accounts/session-schema';
import { Api } from '../core/api/api';
import { FreshPage } from '../core/routing/fresh-page';
import { Session } from '../core/session/session';
import type { SessionFacts } from '../core/session/session-facts';
import type { SessionPort } from '../core/session/session-port';

/** Keeps the core's `Session` in step with the server's. */
@Injectable({ providedIn: 'root' })
export class AccountsSession implements SessionPort {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly freshPage = inject(FreshPage);
  private readonly injector = inject(Injector);

  async read(): Promise<void> {
    this.accept(await this.api.call(readSession, {}));
  }

  /** Takes a session answer over: after signing in, joining, founding or changing one's name. */
  accept({ signedIn, token }: SessionAnswer): void {
    this.session.put(signedIn ?? undefined, token);
  }

  async signOut(): Promise<void> {
    await this.api.call(signOut, {});
    this.freshPage.open('/sign-in');
  }

  async enter(membershipId: string): Promise<void> {
    await this.api.call(enterWorkshop, { body: { membershipId } });
    this.freshPage.open('/');
  }

  async signInAgain(): Promise<boolean> {
    const before = this.session.facts();
    if (!before) return false;
    const now = await this.api.call(readSession, {});
    if (now.signedIn?.accountId === before.accountId) return this.goOn(before, now);
    this.session.put(before, now.token);
    const { askForSignIn } = await import('./sign-in-dialog');
    const again = await askForSignIn(this.injector, before.email);
    return again ? this.goOn(before, again) : false;
  }

  /** Goes on in the workshop one was in; the page as it stands belongs to it. */
  private async goOn(before: SessionFacts, now: SessionAnswer): Promise<boolean> {
    this.session.put(before, now.token);
    const isElsewhere = before.membership && now.signedIn?.membership?.id !== before.membership.id;
    this.accept(
      isElsewhere ? await this.api.call(enterWorkshop, { body: { membershipId: before.membership.id } }) : now,
    );
    return true;
  }
}
