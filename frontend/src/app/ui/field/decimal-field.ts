import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import type { DecimalText } from '#shared/money/decimal';
import { formatDecimal } from '#shared/units/format-decimal';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** An exact decimal (a price, a rate, a share); the form holds the decimal text. Without a `unit` it is the workshop's currency. */
@Component({
  selector: 'app-decimal-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: DecimalField, multi: true }],
})
export class DecimalField extends TypedEntry<DecimalText> {
  readonly unit = input<string>();

  readonly unitText = computed(() => this.unit() ?? this.formats.currencySign());

  protected override read(text: string): ReadEntry<DecimalText> {
    const parsed = parseNumber(text.replace(/\s*%\s*$/, ''), this.formats.locale());
    return parsed.ok ? { ok: true, value: parsed.decimal } : parsed;
  }

  protected override write(value: DecimalText): string {
    return formatDecimal(value, this.formats.locale());
  }

  protected override unreadable(text: string): DecimalText {
    return `? ${text}`;
  }

  protected override empty(): DecimalText {
    return '';
  }
}
