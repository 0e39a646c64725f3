import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { Router } from '@angular/router';
import type { PasswordByLink } from '#shared/accounts/password-endpoints';
import { foundByLink } from '#shared/accounts/workshop-endpoints';
import { Api } from '../core/api/api';
import { AccountsSession } from './accounts-session';
import { LinkPasswordForm } from './link-password-form';
import { StrangerFrame } from './stranger-frame';

/** Where the link of a founding leads. */
@Component({
  selector: 'app-found-page',
  imports: [LinkPasswordForm, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-stranger-frame i18n-heading heading="Found your workshop">
      <app-link-password-form
        i18n-label
        label="Password"
        i18n-hint
        hint="At least 15 characters. If you already have an account under this address, enter its password."
        i18n-sendLabel
        sendLabel="Found it"
        another="/new-workshop"
        [send]="found"
        (taken)="enter()"
      />
    </app-stranger-frame>
  `,
})
export class FoundPage {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly router = inject(Router);

  protected readonly found = async (body: PasswordByLink): Promise<void> =>
    this.accounts.accept(await this.api.call(foundByLink, { body }));

  protected async enter(): Promise<void> {
    await this.router.navigateByUrl('/');
  }
}
