import { ChangeDetectionStrategy, Component, inject, input, output, type OnInit } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { signIn } from '#shared/accounts/session-endpoints';
import { signInSchema, type SessionAnswer } from '#shared/accounts/session-schema';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { PasswordField } from './password-field';

/** E-mail address and password; the same on the page and over it. */
@Component({
  selector: 'app-sign-in-form',
  imports: [Entry, Field, FormComplaint, MatButton, PasswordField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <app-field i18n-label label="E-mail address" [complaint]="form.message('email')">
        <input appEntry type="email" autocomplete="username" formControlName="email" [readonly]="fixedEmail() !== ''" />
      </app-field>
      <app-password-field
        i18n-label
        label="Password"
        formControlName="password"
        [complaint]="form.message('password')"
      />
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Sign in</button>
        <ng-content />
      </div>
    </form>
  `,
})
export class SignInForm implements OnInit {
  private readonly api = inject(Api);

  /** Over a page only its own person may sign in again. */
  readonly fixedEmail = input('');
  readonly signedIn = output<SessionAnswer>();

  protected readonly form = schemaForm(signInSchema, { email: '', password: '' });

  ngOnInit(): void {
    this.form.reset({ email: this.fixedEmail(), password: '' });
  }

  protected async send(): Promise<void> {
    await this.form.send(async (body) => this.signedIn.emit(await this.api.call(signIn, { body })));
  }
}
