import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type FormGroup, ReactiveFormsModule } from '@angular/forms';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { countryChoices, currencyChoices, localeChoices, timeZoneChoices } from './habit-choices';

/** How a workshop writes figures, days and papers: country, currency, language of figures, unit, time zone, paper. */
@Component({
  selector: 'app-habit-fields',
  imports: [Entry, Field, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'whole' },
  templateUrl: './habit-fields.html',
})
export class HabitFields {
  readonly group = input.required<FormGroup>();
  readonly message = input.required<(name: string) => string>();

  protected readonly countries = countryChoices();
  protected readonly currencies = currencyChoices();
  protected readonly timeZones = timeZoneChoices();
  protected readonly locales = computed(() => localeChoices(String(this.group().getRawValue()['locale'] ?? '')));
}
