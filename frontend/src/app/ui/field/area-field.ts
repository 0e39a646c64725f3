import { ChangeDetectionStrategy, Component, computed } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { squareMillimetresPerSquareInch } from '#shared/units/exact-factors';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** An area typed in square centimetres, or square inches where the workshop measures in inches; the form holds square millimetres. */
@Component({
  selector: 'app-area-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: AreaField, multi: true }],
})
export class AreaField extends TypedEntry<number> {
  private readonly isMetric = computed(() => this.formats.lengthUnit() === 'mm');
  private readonly unit_mm2 = computed(() => (this.isMetric() ? 100 : squareMillimetresPerSquareInch));

  readonly unitText = (): string => (this.isMetric() ? 'cm²' : 'in²');

  protected override read(text: string): ReadEntry<number> {
    const parsed = parseNumber(text, this.formats.locale());
    return parsed.ok ? { ok: true, value: parsed.value * this.unit_mm2() } : parsed;
  }

  protected override write(value: number): string {
    return this.formats.typed(Number((value / this.unit_mm2()).toPrecision(12)));
  }

  protected override unreadable(): number {
    return Number.NaN;
  }
}
