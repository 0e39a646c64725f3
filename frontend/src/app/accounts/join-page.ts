import { ChangeDetectionStrategy, Component, computed, inject, resource } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { Router } from '@angular/router';
import { acceptInvitation, readInvitation } from '#shared/accounts/people-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { Skeleton } from '../ui/page/skeleton';
import { AccountsSession } from './accounts-session';
import { fragmentToken } from '../core/routing/fragment-token';
import { PasswordField } from './password-field';
import { StrangerFrame } from './stranger-frame';

/** Where the link of an invitation leads: a new person chooses a password, one who is known enters theirs. */
@Component({
  selector: 'app-join-page',
  imports: [Entry, Field, FormComplaint, MatButton, PasswordField, ReactiveFormsModule, Skeleton, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './join-page.html',
})
export class JoinPage {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly router = inject(Router);

  protected readonly token = fragmentToken();
  protected readonly form = schemaForm(acceptInvitation.body, { token: this.token, name: '', password: '' });
  protected readonly invitation = resource({ loader: () => this.read() });
  protected readonly refusal = computed(() => this.invitation.error()?.message ?? '');

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(async (body) =>
      this.accounts.accept(await this.api.call(acceptInvitation, { body })),
    );
    if (wasTaken) await this.router.navigateByUrl('/');
  }

  private async read() {
    const invitation = await this.api.call(readInvitation, { body: { token: this.token } });
    this.form.group.controls.name.setValue(invitation.name);
    return invitation;
  }
}
