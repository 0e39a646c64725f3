import { ChangeDetectionStrategy, Component, inject, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import { RouterLink } from '@angular/router';
import { askToFound } from '#shared/accounts/workshop-endpoints';
import { Api } from '../core/api/api';
import { schemaForm } from '../core/forms/schema-form';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { habitChoices } from './habit-choices';
import { HabitFields } from './habit-fields';
import { proposedHabits } from './proposed-habits';
import { StrangerFrame } from './stranger-frame';

const isOffered = (locale: string): boolean => habitChoices('').locales.some(({ value }) => value === locale);

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

  constructor() {
    const { country } = this.form.group.controls.workshop.controls;
    country.valueChanges.pipe(takeUntilDestroyed()).subscribe((code) => this.follow(code));
  }

  /** Whatever was not chosen yet goes with the country. */
  private follow(country: string | null): void {
    if (!country) return;
    const { currency, locale, lengthUnit, paperSize } = proposedHabits(`und-${country}`);
    const { controls } = this.form.group.controls.workshop;
    if (controls.currency.pristine) controls.currency.setValue(currency);
    if (controls.locale.pristine && isOffered(locale)) controls.locale.setValue(locale);
    if (controls.lengthUnit.pristine) controls.lengthUnit.setValue(lengthUnit);
    if (controls.paperSize.pristine) controls.paperSize.setValue(paperSize);
  }

  protected async send(): Promise<void> {
    await this.form.send(async (body) => {
      await this.api.call(askToFound, { body });
      this.sentTo.set(body.email);
    });
  }
}
