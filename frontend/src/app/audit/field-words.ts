import { Injectable, inject } from '@angular/core';
import type { FieldChange, FieldValue } from '#shared/audit/field-changes';
import { Formats } from '../core/formats/formats';
import { fieldNames, itemNames } from './field-names';
import { chosenFields, valueNames } from './value-names';

/** A field that differs, in words. */
export interface WordedChange {
  /** Where it stands: “Zone “Face”, relief”. */
  readonly label: string;
  /** What happened to it where there are no two values: “added”. Empty otherwise. */
  readonly deed: string;
  readonly before: string;
  readonly after: string;
}

const longest = 120;

/** “water-burnished” is “water burnished”: items of a rate card go by their marks where the card is not at hand. */
const spoken = (mark: string): string => mark.replace(/-/g, ' ');
const isNumber = (part: string): boolean => /^\d+$/.test(part);
const capitalised = (text: string): string => text.charAt(0).toLocaleUpperCase() + text.slice(1);
const shortened = (text: string): string => (text.length > longest ? `${text.slice(0, longest).trimEnd()} …` : text);

/** Containers that only hold their fields together. */
const silent: ReadonlySet<string> = new Set(['take', 'extent', 'laying', 'length']);

/** Says which fields of a thing differ, and how they read before and after. */
@Injectable({ providedIn: 'root' })
export class FieldWords {
  private readonly formats = inject(Formats);

  of({ path, what, before, after }: FieldChange): WordedChange {
    const field = path.findLast((part) => !isNumber(part)) ?? '';
    const label = capitalised(this.place(path, before ?? after));
    return { label, deed: deeds[what], before: this.value(field, before), after: this.value(field, after) };
  }

  private place(path: readonly string[], value: FieldValue): string {
    return path
      .map((_, index) => this.part(path, index, value))
      .filter(Boolean)
      .join(', ');
  }

  private part(path: readonly string[], index: number, value: FieldValue): string {
    const [key, list, next] = [path[index], path[index - 1] ?? '', path[index + 1]];
    const isLast = next === undefined;
    if (itemNames[list]) return this.item(list, key);
    if (!isLast && (silent.has(key) || itemNames[key])) return '';
    if (key === 'place' && typeof value === 'string') return fieldNames['settings.place'];
    return fieldNames[`${list}.${key}`] ?? fieldNames[key] ?? spoken(key.replace(/_[a-z0-9]+$/, ''));
  }

  private item(list: string, key: string): string {
    const name = itemNames[list];
    return isNumber(key)
      ? $localize`${name}:what: ${key}:number:`
      : $localize`${name}:what: “${valueNames[key] ?? spoken(key)}:name:”`;
  }

  private value(field: string, value: FieldValue): string {
    if (value === null || value === '') return '–';
    if (typeof value === 'boolean') return value ? $localize`yes` : $localize`no`;
    if (typeof value === 'number') return this.figure(field, value);
    if (chosenFields.has(field)) return valueNames[value] ?? spoken(value);
    return field.endsWith('Id') ? spoken(value) : shortened(value);
  }

  private figure(field: string, value: number): string {
    const unit = /_([a-z0-9]+)$/.exec(field)?.[1] ?? '';
    if (unit === 'degrees') return `${this.formats.number(value, 2)}°`;
    return unit === '' ? this.formats.number(value, 3) : this.formats.figure(unit, value);
  }
}

const deeds: Readonly<Record<FieldChange['what'], string>> = {
  changed: '',
  added: $localize`added`,
  removed: $localize`removed`,
  moved: $localize`in another order`,
};
