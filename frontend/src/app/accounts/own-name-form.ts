import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { changeOwnName } from '#shared/accounts/people-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Session } from '../core/session/session';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { AccountsSession } from './accounts-session';

/** How one's own name is written. */
@Component({
  selector: 'app-own-name-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <app-field i18n-label label="Name, as your colleagues see it" [complaint]="form.message('name')">
        <input appEntry autocomplete="name" formControlName="name" />
      </app-field>
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Keep the name</button>
      </div>
    </form>
  `,
})
export class OwnNameForm {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly notices = inject(Notices);

  protected readonly form = schemaForm(changeOwnName.body, { name: inject(Session).facts()?.name ?? '' });

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(async (body) =>
      this.accounts.accept(await this.api.call(changeOwnName, { body })),
    );
    if (wasTaken) this.notices.say($localize`Your name is kept.`);
  }
}
