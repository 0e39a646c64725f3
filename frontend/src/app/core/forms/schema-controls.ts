import { FormControl, FormGroup } from '@angular/forms';
import * as z from 'zod';

/** What a form begins with: every field of the schema, null or empty text where nothing is entered yet. */
export type Entries<S extends z.ZodObject> = {
  readonly [K in keyof z.input<S>]-?: S['shape'][K & string] extends z.ZodObject
    ? Entries<S['shape'][K & string]>
    : Exclude<z.input<S>[K], undefined> | null;
};

type ControlOf<F> = F extends z.ZodObject
  ? FormGroup<SchemaControls<F>>
  : F extends z.ZodType
    ? FormControl<z.input<F> | null>
    : never;

/** The typed controls of a schema: a group for an object within, one control for anything else. */
export type SchemaControls<S extends z.ZodObject> = { [K in keyof S['shape'] & string]: ControlOf<S['shape'][K]> };

/** One control for each field of the schema. */
export function schemaControls<S extends z.ZodObject>(schema: S, entries: Entries<S>): FormGroup<SchemaControls<S>> {
  const controls = Object.entries(schema.shape).map(([key, field]) => {
    const entry = (entries as Record<string, unknown>)[key] ?? null;
    return [key, field instanceof z.ZodObject ? schemaControls(field, entry as never) : new FormControl(entry)];
  });
  return new FormGroup(Object.fromEntries(controls) as SchemaControls<S>);
}

const isEmpty = (entry: unknown): boolean => entry === null || entry === '';

/** What was entered, as the schema wants it: an optional field left empty is absent. */
export function entered(schema: z.ZodObject, entries: Readonly<Record<string, unknown>>): Record<string, unknown> {
  const present = Object.entries(schema.shape).filter(
    ([key, field]) => !(isEmpty(entries[key]) && (field as z.ZodType).safeParse(undefined).success),
  );
  return Object.fromEntries(
    present.map(([key, field]) => [
      key,
      field instanceof z.ZodObject ? entered(field, entries[key] as Record<string, unknown>) : entries[key],
    ]),
  );
}
