import { ChangeDetectionStrategy, Component } from '@angular/core';
import { NG_VALUE_ACCESSOR } from '@angular/forms';
import { parseArea } from '#shared/units/parse-area';
import type { AreaEntry } from '../../core/forms/typed-measure';
import { Entry } from './entry';
import { Field } from './field';
import { TypedEntry, type ReadEntry } from './typed-entry';

/** An area with its unit as one likes, 0.12 m² or 1200 cm²; the form holds text and square millimetres. */
@Component({
  selector: 'app-area-field',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './typed-entry.html',
  providers: [{ provide: NG_VALUE_ACCESSOR, useExisting: AreaField, multi: true }],
})
export class AreaField extends TypedEntry<AreaEntry> {
  /** The unit is part of what is typed. */
  readonly unitText = (): string => '';

  protected override read(text: string): ReadEntry<AreaEntry> {
    const parsed = parseArea(text, { unit: this.formats.lengthUnit(), locale: this.formats.locale() });
    return parsed.ok ? { ok: true, value: { text, mm2: parsed.mm2 } } : parsed;
  }

  protected override write(value: AreaEntry): string {
    return value.text;
  }

  protected override unreadable(text: string): AreaEntry {
    return { text, mm2: Number.NaN };
  }
}
