import { ChangeDetectionStrategy, Component, DOCUMENT, afterNextRender, inject, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { askForClientSignIn } from '#shared/client-page/visits-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { ClientFrame } from './client-frame';
import { uncover } from './opening-head';

/** A client with several jobs asks for a link to all of their papers; the answer does not say whether the address is known. */
@Component({
  selector: 'app-client-sign-in-page',
  imports: [ClientFrame, Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-client-frame>
      <div class="stack">
        <h1 i18n>A link to your papers</h1>
        @if (sentTo(); as address) {
          <p role="status" i18n>
            If a workshop knows {{ address }}, a letter with a link is on its way there. It opens for an hour.
          </p>
        } @else {
          <p i18n>Enter the address your letters go to. A link to all of your estimates and invoices is sent there.</p>
          <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
            <app-field i18n-label label="E-mail address" [complaint]="form.message('email')">
              <input appEntry type="email" autocomplete="email" formControlName="email" />
            </app-field>
            <app-form-complaint [texts]="form.general()" />
            <div class="actions">
              <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Send the link</button>
            </div>
          </form>
        }
      </div>
    </app-client-frame>
  `,
  styles: `
    .stack {
      max-width: 480px;
    }
  `,
})
export class ClientSignInPage {
  private readonly api = inject(Api);

  protected readonly form = schemaForm(askForClientSignIn.body, { email: '' });
  protected readonly sentTo = signal('');

  constructor() {
    const document = inject(DOCUMENT);
    afterNextRender(() => uncover(document));
  }

  protected async send(): Promise<void> {
    await this.form.send(async (body) => {
      await this.api.call(askForClientSignIn, { body });
      this.sentTo.set(body.email);
    });
  }
}
