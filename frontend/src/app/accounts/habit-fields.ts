import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { type FormGroup, ReactiveFormsModule } from '@angular/forms';
import { paperSizes } from '#shared/accounts/workshop-options';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { habitChoices } from './habit-choices';

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
  /** The one a workshop has, offered even where it is a rare one. */
  readonly presentLocale = input('');

  protected readonly paperSizes = paperSizes;
  protected readonly choices = computed(() => habitChoices(this.presentLocale()));
}
