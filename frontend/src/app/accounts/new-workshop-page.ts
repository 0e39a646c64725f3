import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { askToFound } from '#shared/accounts/workshop-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { HabitFields } from './habit-fields';
import { proposedHabits } from './proposed-habits';
import { StrangerFrame } from './stranger-frame';

@Component({
  selector: 'app-new-workshop-page',
  imports: [Entry, Field, FormComplaint, HabitFields, MatButton, ReactiveFormsModule, RouterLink, StrangerFrame],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './new-workshop-page.html',
})
export class NewWorkshopPage {
  private readonly api = inject(Api);

  protected readonly proposed = proposedHabits(navigator.language);
  protected readonly sentTo = signal('');
  protected readonly form = schemaForm(askToFound.body, {
    name: '',
    email: '',
    workshop: { name: '', ...this.proposed },
  });
  protected readonly habitMessage = (name: string): string => this.form.message(`workshop.${name}`);

  protected async send(): Promise<void> {
    await this.form.send(async (body) => {
      await this.api.call(askToFound, { body });
      this.sentTo.set(body.email);
    });
  }
}
