import { ChangeDetectionStrategy, Component, computed, input, output, signal } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { decimalSign } from '#shared/units/decimal-sign';
import { lengthFigure } from '#shared/units/format-length';
import { parseLength } from '#shared/units/parse-length';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/**
 * A length whose form holds plain millimetres, in the workshop's unit, decimals or fractions. What was typed goes out beside it, and
 * comes back in to be shown again as it was written.
 */
@Component({
  selector: 'app-millimetre-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: MillimetreField, multi: true }],
})
export class MillimetreField extends TypedEntry<number> {
  private readonly known_mm = signal<number | undefined>(undefined);

  /** The text as it was typed, shown where it still says this length. */
  readonly typedText = input<string>();
  /** The text as it is typed, told before the length itself. */
  readonly typedAs = output<string>();

  readonly unitText = computed(() => this.formats.lengthUnit());
  override readonly otherReading = computed(() => {
    const known = this.known_mm();
    return known === undefined || this.dense() ? '' : this.formats.otherLength(known);
  });

  override writeValue(value: number | null): void {
    super.writeValue(value);
    this.known_mm.set(value ?? undefined);
  }

  protected override read(text: string): ReadEntry<number> {
    this.typedAs.emit(text);
    const parsed = this.parse(text);
    this.known_mm.set(parsed.ok ? parsed.mm : undefined);
    return parsed.ok ? { ok: true, value: parsed.mm } : parsed;
  }

  protected override write(value: number): string {
    const typed = this.typedText();
    const parsed = typed === undefined ? undefined : this.parse(typed);
    if (typed !== undefined && parsed?.ok && parsed.mm === value) return typed;
    return lengthFigure(value, this.formats.lengthUnit(), this.formats.locale()).figure;
  }

  protected override unreadable(): number {
    return Number.NaN;
  }

  private parse(text: string) {
    return parseLength(text, { unit: this.formats.lengthUnit(), decimalSign: decimalSign(this.formats.locale()) });
  }
}
