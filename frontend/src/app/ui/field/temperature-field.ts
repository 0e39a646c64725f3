import { ChangeDetectionStrategy, Component } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { parseNumber } from '#shared/units/parse-number';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** A temperature in the workshop's degrees; the form holds °C. */
@Component({
  selector: 'app-temperature-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: TemperatureField, multi: true }],
})
export class TemperatureField extends TypedEntry<number> {
  readonly unitText = (): string => this.formats.temperatureSign();

  protected override read(text: string): ReadEntry<number> {
    const parsed = parseNumber(text, this.formats.locale());
    return parsed.ok ? { ok: true, value: this.formats.celsius(parsed.value) } : parsed;
  }

  protected override write(value: number): string {
    return this.formats.typed(this.formats.degrees(value));
  }

  protected override unreadable(): number {
    return Number.NaN;
  }
}
