import { ChangeDetectionStrategy, Component, input, output } from '@angular/core';
import { Entry } from '../ui/field/entry';
import type { EntryChoice } from '../ui/field/entry-at';
import { Field } from '../ui/field/field';

/** A choice that puts something else into the form, rather than being an entry itself. */
@Component({
  selector: 'app-choice-entry',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field [label]="label()">
      <select #entry appEntry [disabled]="isDisabled()" (change)="picked.emit(entry.value)">
        @for (choice of choices(); track choice.value) {
          <option [value]="choice.value" [selected]="choice.value === chosen()">{{ choice.label }}</option>
        }
      </select>
    </app-field>
  `,
})
export class ChoiceEntry {
  readonly label = input.required<string>();
  readonly choices = input.required<readonly EntryChoice[]>();
  readonly chosen = input<string>();
  readonly isDisabled = input(false);
  readonly picked = output<string>();
}
