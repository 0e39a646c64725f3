import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router, RouterLink } from '@angular/router';
import { foundByLink } from '#shared/accounts/workshop-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { FormComplaint } from '../ui/field/form-complaint';
import { AccountsSession } from './accounts-session';
import { fragmentToken } from '../core/routing/fragment-token';
import { PasswordField } from './password-field';
import { StrangerFrame } from './stranger-frame';

/** Where the link of a founding leads. */
@Component({
  selector: 'app-found-page',
  imports: [FormComplaint, MatButton, PasswordField, ReactiveFormsModule, RouterLink, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-stranger-frame i18n-heading heading="Found your workshop">
      @if (token) {
        <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
          <app-password-field
            i18n-label
            label="Password"
            i18n-hint
            hint="At least 15 characters. If you already have an account under this address, enter its password."
            formControlName="password"
            [isNew]="true"
            [complaint]="form.message('password')"
          />
          <app-form-complaint [texts]="form.general()" />
          <div class="actions">
            <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Found it</button>
          </div>
        </form>
      } @else {
        <p i18n>
          This address lacks its secret part. Open the link of the mail itself, or
          <a routerLink="/new-workshop">ask for another</a>.
        </p>
      }
    </app-stranger-frame>
  `,
})
export class FoundPage {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly router = inject(Router);

  protected readonly token = fragmentToken();
  protected readonly form = schemaForm(foundByLink.body, { token: this.token, password: '' });

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(async (body) =>
      this.accounts.accept(await this.api.call(foundByLink, { body })),
    );
    if (wasTaken) await this.router.navigateByUrl('/');
  }
}
