import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { askForReset } from '#shared/accounts/password-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { StrangerFrame } from './stranger-frame';

@Component({
  selector: 'app-forgotten-password-page',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule, RouterLink, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (sentTo(); as email) {
      <app-stranger-frame i18n-heading heading="Look into your mail">
        <p role="status" i18n>
          If {{ email }} is known here, a link is on its way there. It works once and for ten minutes.
        </p>
        <p><a routerLink="/sign-in" i18n>Back to signing in</a></p>
      </app-stranger-frame>
    } @else {
      <app-stranger-frame
        i18n-heading
        heading="A new password"
        i18n-about
        about="We mail you a link with which to choose one."
      >
        <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
          <app-field i18n-label label="E-mail address" [complaint]="form.message('email')">
            <input appEntry type="email" autocomplete="username" formControlName="email" />
          </app-field>
          <app-form-complaint [texts]="form.general()" />
          <div class="actions">
            <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Send the link</button>
            <a routerLink="/sign-in" i18n>Back to signing in</a>
          </div>
        </form>
      </app-stranger-frame>
    }
  `,
})
export class ForgottenPasswordPage {
  private readonly api = inject(Api);

  protected readonly sentTo = signal('');
  protected readonly form = schemaForm(askForReset.body, { email: '' });

  protected async send(): Promise<void> {
    await this.form.send(async (body) => {
      await this.api.call(askForReset, { body });
      this.sentTo.set(body.email);
    });
  }
}
