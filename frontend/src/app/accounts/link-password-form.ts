import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { passwordByLinkSchema, type PasswordByLink } from '#shared/accounts/password-endpoints';
import { schemaForm } from '../core/forms/schema-form';
import { fragmentToken } from '../core/routing/fragment-token';
import { FormComplaint } from '../ui/field/form-complaint';
import { PasswordField } from './password-field';

/** A password entered where a mailed link leads; without the secret of the link the way to another one. */
@Component({
  selector: 'app-link-password-form',
  imports: [FormComplaint, MatButton, PasswordField, ReactiveFormsModule, RouterLink],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (token) {
      <form class="fields single" [formGroup]="form.group" (ngSubmit)="submit()">
        <app-password-field
          [label]="label()"
          [hint]="hint()"
          formControlName="password"
          [isNew]="true"
          [complaint]="form.message('password')"
        />
        <app-form-complaint [texts]="form.general()" />
        <div class="actions">
          <button matButton="filled" type="submit" [disabled]="form.isSending()">{{ sendLabel() }}</button>
        </div>
      </form>
    } @else {
      <p i18n>
        This address lacks its secret part. Open the link of the mail itself, or
        <a [routerLink]="another()">ask for another</a>.
      </p>
    }
  `,
})
export class LinkPasswordForm {
  readonly label = input.required<string>();
  readonly hint = input.required<string>();
  readonly sendLabel = input.required<string>();
  /** Where another link is asked for. */
  readonly another = input.required<string>();
  readonly send = input.required<(entered: PasswordByLink) => Promise<unknown>>();
  /** The password was taken. */
  readonly taken = output();

  protected readonly token = fragmentToken();
  protected readonly form = schemaForm(passwordByLinkSchema, { token: this.token, password: '' });

  protected async submit(): Promise<void> {
    if (await this.form.send((entered) => this.send()(entered))) this.taken.emit();
  }
}
