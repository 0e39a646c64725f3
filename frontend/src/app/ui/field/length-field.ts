import { ChangeDetectionStrategy, Component, booleanAttribute, computed, input, signal } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { decimalSign } from '#shared/units/decimal-sign';
import { parseLength } from '#shared/units/parse-length';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** A length with its text as typed, so that 2 3/8 in is shown again as 2 3/8 in. */
export interface TypedLength {
  readonly text: string;
  readonly mm: number;
}

/** A length in the workshop's unit, decimals or fractions; the form holds text and millimetres. The other unit is shown, marked ≈. */
@Component({
  selector: 'app-length-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: LengthField, multi: true }],
})
export class LengthField extends TypedEntry<TypedLength> {
  /** A displacement, which may be negative. */
  readonly signed = input(false, { transform: booleanAttribute });
  private readonly known_mm = signal<number | undefined>(undefined);

  /** Behind a bare figure; a text that names its own unit needs none. */
  readonly unitText = computed(() => (/[a-z'"′″’”]/i.test(this.text()) ? '' : this.formats.lengthUnit()));
  override readonly otherReading = computed(() => {
    const known = this.known_mm();
    return known === undefined ? '' : this.formats.otherLength(known, this.text());
  });

  override writeValue(value: TypedLength | null): void {
    super.writeValue(value);
    this.known_mm.set(value?.mm);
  }

  protected override read(text: string): ReadEntry<TypedLength> {
    const minus = this.signed() ? (/^\s*[-−]\s*/.exec(text)?.[0] ?? '') : '';
    const parsed = parseLength(text.slice(minus.length), {
      unit: this.formats.lengthUnit(),
      decimalSign: decimalSign(this.formats.locale()),
    });
    const length_mm = parsed.ok ? (minus ? 0 - parsed.mm : parsed.mm) : undefined;
    this.known_mm.set(length_mm);
    return parsed.ok ? { ok: true, value: { text, mm: length_mm ?? 0 } } : parsed;
  }

  protected override write(value: TypedLength): string {
    return value.text;
  }

  protected override unreadable(text: string): TypedLength {
    return { text, mm: Number.NaN };
  }
}
