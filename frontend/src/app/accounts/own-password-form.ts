import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { changePassword } from '#shared/accounts/password-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { FormComplaint } from '../ui/field/form-complaint';
import { PasswordField } from './password-field';

/** A new password, for somebody who knows the present one. */
@Component({
  selector: 'app-own-password-form',
  imports: [FormComplaint, MatButton, PasswordField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <input
        class="visually-hidden"
        type="text"
        autocomplete="username"
        tabindex="-1"
        aria-hidden="true"
        readonly
        [value]="email()"
      />
      <app-password-field
        i18n-label
        label="Present password"
        formControlName="current"
        [complaint]="form.message('current')"
      />
      <app-password-field
        i18n-label
        label="New password"
        i18n-hint
        hint="At least 15 characters. Your other sessions end with it."
        formControlName="password"
        [isNew]="true"
        [complaint]="form.message('password')"
      />
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Change the password</button>
      </div>
    </form>
  `,
})
export class OwnPasswordForm {
  private readonly api = inject(Api);
  private readonly session = inject(Session);
  private readonly notices = inject(Notices);

  /** Unseen, but a password keeper wants to know whose password this is. */
  protected readonly email = computed(() => this.session.facts()?.email ?? '');
  protected readonly form = schemaForm(changePassword.body, { current: '', password: '' });

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send((body) => this.api.call(changePassword, { body }));
    if (!wasTaken) return;
    this.form.reset({ current: '', password: '' });
    this.notices.say($localize`The new password is kept; other sessions have ended.`);
  }
}
