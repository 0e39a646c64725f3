import { ChangeDetectionStrategy, Component, inject, input, type OnInit, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { changeRoles } from '#shared/accounts/people-endpoints';
import type { WorkshopPerson } from '#shared/accounts/people-schema';
import { schemaForm } from '../core/forms/schema-form';
import { FormComplaint } from '../ui/field/form-complaint';
import { PeopleStore } from './people-store';
import { RoleChoice } from './role-choice';

/** Changes what one person does here. */
@Component({
  selector: 'app-roles-form',
  imports: [FormComplaint, MatButton, ReactiveFormsModule, RoleChoice],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single" [formGroup]="form.group" (ngSubmit)="send()">
      <app-role-choice
        i18n-label
        label="What they do here"
        formControlName="roles"
        [complaint]="form.message('roles')"
      />
      <app-form-complaint [texts]="form.general()" />
      <div class="actions">
        <button matButton="outlined" type="submit" [disabled]="form.isSending()" i18n>Keep</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave as it was</button>
      </div>
    </form>
  `,
})
export class RolesForm implements OnInit {
  private readonly store = inject(PeopleStore);

  readonly person = input.required<WorkshopPerson>();
  readonly closed = output();

  protected readonly form = schemaForm(changeRoles.body, { roles: [] });

  ngOnInit(): void {
    this.form.reset({ roles: this.person().roles });
  }

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send(({ roles }) => this.store.changeRoles(this.person(), roles));
    if (wasTaken) this.closed.emit();
  }
}
