import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { foundAnother } from '#shared/accounts/workshop-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { FreshPage } from '../core/routing/fresh-page';
import { Session } from '../core/session/session';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { AccountsSession } from './accounts-session';
import { HabitFields } from './habit-fields';
import { proposedHabits } from './proposed-habits';
import { StrangerFrame } from './stranger-frame';

/** A person's workshops, to go to one, or to found another of their own. */
@Component({
  selector: 'app-choose-workshop-page',
  imports: [Entry, Field, FormComplaint, HabitFields, MatButton, ReactiveFormsModule, RouterLink, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './choose-workshop-page.html',
})
export class ChooseWorkshopPage {
  private readonly api = inject(Api);
  private readonly accounts = inject(AccountsSession);
  private readonly freshPage = inject(FreshPage);

  protected readonly who = inject(Session).facts;
  protected readonly proposed = proposedHabits(navigator.language);
  protected readonly form = schemaForm(foundAnother.body, { name: '', ...this.proposed });
  protected readonly message = (name: string): string => this.form.message(name);

  protected enter(membershipId: string): Promise<void> {
    return this.accounts.enter(membershipId);
  }

  protected async send(): Promise<void> {
    const wasTaken = await this.form.send((body) => this.api.call(foundAnother, { body }));
    if (wasTaken) this.freshPage.open('/');
  }

  protected signOut(): Promise<void> {
    return this.accounts.signOut();
  }
}
