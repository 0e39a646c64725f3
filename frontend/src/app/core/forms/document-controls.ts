import { type AbstractControl, FormArray, FormControl, FormGroup } from '@angular/forms';
import { isMeasureName, isTypedMeasure, rememberedText, typedMeasure, type Writing } from './typed-measure';

/** The texts of lengths and areas as they were typed, by the path of their entry. */
export type TypedTexts = Readonly<Record<string, string>>;

interface Place {
  readonly name: string;
  readonly path: string;
}

const at = ({ name, path }: Place, key: string | number): Place => ({
  // What stands in a list of lengths is a length too.
  name: typeof key === 'number' ? name : key,
  path: path ? `${path}.${key}` : String(key),
});

/** Controls for a value of any make: a group for an object, a list for a list, one control for anything else. */
export function documentControls(
  value: unknown,
  typed: TypedTexts,
  { writing, place = { name: '', path: '' } }: { writing: Writing; place?: Place },
): AbstractControl {
  const inner = (key: string | number, part: unknown) =>
    documentControls(part, typed, { writing, place: at(place, key) });
  if (Array.isArray(value)) return new FormArray(value.map((part, index) => inner(index, part)));
  if (typeof value === 'object' && value !== null)
    return new FormGroup(Object.fromEntries(Object.entries(value).map(([key, part]) => [key, inner(key, part)])));
  return typeof value === 'number' && isMeasureName(place.name)
    ? new FormControl(typedMeasure(value, typed[place.path], { ...writing, name: place.name }))
    : new FormControl(value);
}

/** What was entered, as plain values, with the texts of its lengths and areas beside it. */
export function enteredDocument(root: AbstractControl, writing: Writing): { value: unknown; typed: TypedTexts } {
  const typed: Record<string, string> = {};
  const read = (control: AbstractControl, path: string): unknown => {
    const inner = (key: string | number, child: AbstractControl) => read(child, path ? `${path}.${key}` : String(key));
    if (control instanceof FormArray) return control.controls.map((child, index) => inner(index, child));
    if (control instanceof FormGroup)
      return Object.fromEntries(Object.entries(control.controls).map(([key, child]) => [key, inner(key, child)]));
    const entry: unknown = control.value;
    if (!isTypedMeasure(entry)) return entry;
    const text = rememberedText(entry, writing);
    if (text !== undefined) typed[path] = text;
    return 'mm' in entry ? entry.mm : entry.mm2;
  };
  return { value: read(root, ''), typed };
}
