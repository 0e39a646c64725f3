import { ChangeDetectionStrategy, Component, inject, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import * as z from 'zod';
import { rateCardName } from '#shared/rate-cards/rate-card-summary-schema';
import { schemaForm } from '../../core/forms/schema-form';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { CardStore } from './card-store';

const nameSchema = z.strictObject({ name: rateCardName });

/** What a draft is called. */
@Component({
  selector: 'app-card-name-form',
  imports: [Entry, Field, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields single sheet" [formGroup]="form.group" (ngSubmit)="take()">
      <app-field i18n-label label="Name of the card" [complaint]="form.message('name')">
        <input appEntry type="text" autocomplete="off" formControlName="name" />
      </app-field>
      <div class="actions">
        <button matButton="outlined" type="submit" i18n>Take the name</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it as it is</button>
      </div>
    </form>
  `,
})
export class CardNameForm {
  private readonly store = inject(CardStore);

  readonly closed = output();

  protected readonly form = schemaForm(nameSchema, { name: this.store.entered()?.name ?? '' });

  protected take(): void {
    this.form.showAll();
    const [parsed, entered] = [this.form.parsed(), this.store.entered()];
    if (!parsed || !entered) return;
    this.store.enter({ ...entered, name: parsed.name });
    this.closed.emit();
  }
}
