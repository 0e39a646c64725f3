import { ChangeDetectionStrategy, Component, inject, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { newInvitationSchema } from '#shared/accounts/people-schema';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { PeopleStore } from './people-store';
import { RoleChoice } from './role-choice';

/** Invites one person. */
@Component({
  selector: 'app-invite-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule, RoleChoice],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields" [formGroup]="form.group" (ngSubmit)="send()">
      <app-field i18n-label label="Name" [complaint]="form.message('name')">
        <input appEntry autocomplete="off" formControlName="name" />
      </app-field>
      <app-field i18n-label label="E-mail address" [complaint]="form.message('email')">
        <input appEntry type="email" autocomplete="off" formControlName="email" />
      </app-field>
      <app-role-choice
        i18n-label
        label="What they do here"
        formControlName="roles"
        [complaint]="form.message('roles')"
      />
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="form.isSending()" i18n>Send the invitation</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Close</button>
      </div>
    </form>
  `,
})
export class InviteForm {
  private readonly store = inject(PeopleStore);
  private readonly notices = inject(Notices);

  readonly closed = output();

  protected readonly form = schemaForm(newInvitationSchema, { name: '', email: '', roles: [] });

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(async (body) => {
      await this.store.invite(body);
      this.notices.say($localize`${body.name}:name: is invited; the link lasts three days.`);
    });
    if (wasTaken) this.closed.emit();
  }
}
