import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import { Router, RouterLink } from '@angular/router';
import type { SessionAnswer } from '#shared/accounts/session-schema';
import { AccountsSession } from './accounts-session';
import { SignInForm } from './sign-in-form';
import { StrangerFrame } from './stranger-frame';
import { wayBack } from './way-back';

@Component({
  selector: 'app-sign-in-page',
  imports: [RouterLink, SignInForm, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-stranger-frame i18n-heading heading="Sign in">
      <app-sign-in-form (signedIn)="enter($event)">
        <a routerLink="/forgotten-password" i18n>Forgotten your password?</a>
      </app-sign-in-form>
      <p class="muted" i18n>No workshop here yet? <a routerLink="/new-workshop">Found one</a>.</p>
    </app-stranger-frame>
  `,
})
export class SignInPage {
  private readonly accounts = inject(AccountsSession);
  private readonly router = inject(Router);

  /** The address somebody was on the way to. */
  readonly next = input<string>();

  protected async enter(answer: SessionAnswer): Promise<void> {
    this.accounts.accept(answer);
    await this.router.navigateByUrl(wayBack(this.next()));
  }
}
