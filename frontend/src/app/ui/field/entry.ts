import { Directive, inject } from '@angular/core';
import { Field } from './field';

/** Dresses an input, select or textarea and ties it to the `app-field` around it. */
@Directive({
  selector: 'input[appEntry], select[appEntry], textarea[appEntry]',
  host: {
    class: 'entry',
    '[id]': 'field?.entryId ?? null',
    '[attr.aria-describedby]': 'field?.describedBy() ?? null',
    '[attr.aria-invalid]': 'field?.isWrong() || null',
  },
})
export class Entry {
  protected readonly field = inject(Field, { optional: true });
}
