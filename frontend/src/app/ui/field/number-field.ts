import { ChangeDetectionStrategy, Component, input } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** A number typed with the workshop's decimal sign; the form holds a number. `unit` is written behind it. */
@Component({
  selector: 'app-number-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: NumberField, multi: true }],
})
export class NumberField extends TypedEntry<number> {
  readonly unit = input('');

  readonly unitText = (): string => this.unit();

  protected override read(text: string): ReadEntry<number> {
    const parsed = parseNumber(text, this.formats.locale());
    return parsed.ok ? { ok: true, value: parsed.value } : parsed;
  }

  protected override write(value: number): string {
    return this.formats.typed(value);
  }

  protected override unreadable(): number {
    return Number.NaN;
  }
}
