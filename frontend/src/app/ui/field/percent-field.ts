import { ChangeDetectionStrategy, Component } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** A percentage; the form holds the number before the sign (18 for 18 %). The sign itself may be typed or left out. */
@Component({
  selector: 'app-percent-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: PercentField, multi: true }],
})
export class PercentField extends TypedEntry<number> {
  readonly unitText = (): string => '%';

  protected override read(text: string): ReadEntry<number> {
    const parsed = parseNumber(text.replace(/\s*%\s*$/, ''), this.formats.locale());
    return parsed.ok ? { ok: true, value: parsed.value } : parsed;
  }

  protected override write(value: number): string {
    return this.formats.typed(value);
  }

  protected override unreadable(): number {
    return Number.NaN;
  }
}
