import { Rejection } from '#shared/problems/rejection';
import type * as z from 'zod';

/** Where a page ended, for the query of the next: the values of its last row in the columns of the order. */
export const cursorAt = (values: readonly unknown[]): string =>
  Buffer.from(JSON.stringify(values)).toString('base64url');

const json = (text: string): unknown => {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
};

/** What a cursor says, as the order's schema has it; refuses one that was not made by `cursorAt`. */
export function readCursor<S extends z.ZodType>(cursor: string, schema: S): z.infer<S> {
  const read = schema.safeParse(json(Buffer.from(cursor, 'base64url').toString()));
  if (read.success) return read.data;
  const complaint = { path: ['query', 'cursor'], code: 'entry-wrong-form', values: {} } as const;
  throw new Rejection('invalid', 'problem-invalid', { complaints: [complaint] });
}
