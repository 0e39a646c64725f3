import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { TaxCode } from '#shared/money/tax-codes';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Entry } from '../ui/field/entry';
import { EntryAt } from '../ui/field/entry-at';
import { Field } from '../ui/field/field';
import { exemptionChoices, exemptionCodeOf, exemptionNames } from './exemption-names';
import { taxCodeNames } from '../core/formats/tax-code-names';

/** Why a category charges no tax: in words for the paper, and by a code of the list VATEX, found by typing what it is about. */
@Component({
  selector: 'app-exemption-entry',
  imports: [Entry, EntryAt, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { class: 'fields' },
  template: `
    <app-entry-at
      class="whole"
      way="line"
      [form]="form()"
      [path]="path() + '.reason'"
      [label]="taxNames[code()]"
      i18n-hint
      hint="Why no tax is charged, as it stands on the paper; your local rules name the words."
    />
    @if (choices().length > 1) {
      <app-field
        class="whole"
        i18n-label
        label="Code of the reason"
        [hint]="said()"
        [optional]="true"
        [complaint]="form().message(path() + '.reasonCode')"
      >
        <input
          appEntry
          #entry
          autocomplete="off"
          spellcheck="false"
          [attr.list]="listId()"
          [value]="form().value(path() + '.reasonCode') ?? ''"
          (change)="put(entry.value)"
        />
      </app-field>
      <datalist [id]="listId()">
        @for (choice of choices(); track choice.value) {
          <option [value]="choice.value">{{ choice.name }}</option>
        }
      </datalist>
    }
  `,
})
export class ExemptionEntry {
  readonly form = input.required<AnyDocumentForm>();
  readonly path = input.required<string>();
  readonly code = input.required<TaxCode>();

  protected readonly taxNames = taxCodeNames;
  protected readonly choices = computed(() => exemptionChoices(this.code()));
  protected readonly listId = computed(() => `exemptions-${this.code()}`);
  /** What the code stands for, once it is there. */
  protected readonly said = computed(() => {
    const code = this.form().value<string>(`${this.path()}.reasonCode`) ?? '';
    return exemptionNames[code] ?? $localize`Type what it is about, or a code of the list VATEX.`;
  });

  protected put(text: string): void {
    this.form().control<string>(`${this.path()}.reasonCode`).setValue(exemptionCodeOf(text));
  }
}
