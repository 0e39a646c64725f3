import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { Router } from '@angular/router';
import { resetPassword, type PasswordByLink } from '#shared/accounts/password-endpoints';
import { Api } from '../core/api/api';
import { Notices } from '../core/problems/notices';
import { LinkPasswordForm } from './link-password-form';
import { StrangerFrame } from './stranger-frame';

/** Where the link of a forgotten password leads. */
@Component({
  selector: 'app-new-password-page',
  imports: [LinkPasswordForm, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-stranger-frame i18n-heading heading="Choose a new password">
      <app-link-password-form
        i18n-label
        label="New password"
        i18n-hint
        hint="At least 15 characters; a few words that do not belong together are easy to keep in mind."
        i18n-sendLabel
        sendLabel="Keep it"
        another="/forgotten-password"
        [send]="reset"
        (taken)="leave()"
      />
    </app-stranger-frame>
  `,
})
export class NewPasswordPage {
  private readonly api = inject(Api);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);

  protected readonly reset = (body: PasswordByLink) => this.api.call(resetPassword, { body });

  protected async leave(): Promise<void> {
    this.notices.say($localize`Your new password is kept. Please sign in with it.`);
    await this.router.navigateByUrl('/sign-in');
  }
}
