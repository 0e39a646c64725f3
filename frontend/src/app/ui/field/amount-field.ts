import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { exactMinor } from '#shared/money/minor-of';
import { textOf } from '#shared/money/text-of';
import { formatDecimal } from '#shared/units/format-decimal';
import { unread } from '#shared/units/parsed';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** An amount of money; the form holds whole minor units. What has more decimals than the currency is refused, never rounded. */
@Component({
  selector: 'app-amount-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: AmountField, multi: true }],
})
export class AmountField extends TypedEntry<MinorUnits> {
  /** Of the paper it is for; without one the currency of the books. */
  readonly currency = input<string>();

  private readonly digits = computed(() => currencyDigits(this.currency() ?? this.formats.currency()));
  readonly unitText = computed(() => {
    const currency = this.currency() ?? this.formats.currency();
    return currency === this.formats.currency() ? this.formats.currencySign() : currency;
  });

  protected override read(text: string): ReadEntry<MinorUnits> {
    const parsed = parseNumber(text, this.formats.locale());
    if (!parsed.ok) return parsed;
    const exact = exactMinor(parsed.decimal, this.digits());
    const amount_minor = exact.toNumber();
    if (!exact.isInteger()) return unread('amount-too-fine', { decimals: this.digits() });
    return Number.isSafeInteger(amount_minor) ? { ok: true, value: amount_minor } : unread('invoice-too-large');
  }

  protected override write(amount_minor: MinorUnits): string {
    return Number.isSafeInteger(amount_minor)
      ? formatDecimal(textOf(amount_minor, this.digits()), this.formats.locale())
      : '';
  }

  protected override unreadable(): MinorUnits {
    return Number.NaN;
  }
}
