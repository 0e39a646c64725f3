import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { resetPassword } from '#shared/accounts/password-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { FormComplaint } from '../ui/field/form-complaint';
import { fragmentToken } from '../core/routing/fragment-token';
import { PasswordField } from './password-field';
import { StrangerFrame } from './stranger-frame';

@Component({
  selector: 'app-new-password-page',
  imports: [FormComplaint, MatButton, PasswordField, ReactiveFormsModule, RouterLink, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-stranger-frame i18n-heading heading="Choose a new password">
      @if (token) {
        <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
          <app-password-field
            i18n-label
            label="New password"
            i18n-hint
            hint="At least 15 characters; a few words that do not belong together are easy to keep in mind."
            formControlName="password"
            [isNew]="true"
            [complaint]="form.message('password')"
          />
          <app-form-complaint [texts]="form.general()" />
          <div class="actions">
            <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Keep it</button>
          </div>
        </form>
      } @else {
        <p i18n>
          This address lacks its secret part. Open the link of the mail itself, or
          <a routerLink="/forgotten-password">ask for another</a>.
        </p>
      }
    </app-stranger-frame>
  `,
})
export class NewPasswordPage {
  private readonly api = inject(Api);
  private readonly router = inject(Router);
  private readonly notices = inject(Notices);

  protected readonly token = fragmentToken();
  protected readonly form = schemaForm(resetPassword.body, { token: this.token, password: '' });

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send((body) => this.api.call(resetPassword, { body }));
    if (!wasTaken) return;
    this.notices.say($localize`Your new password is kept. Please sign in with it.`);
    await this.router.navigateByUrl('/sign-in');
  }
}
