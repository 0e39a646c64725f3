import { Rejection } from '#shared/problems/rejection';

/** What a column that a list is ordered by holds. */
export type CursorKind = 'instant' | 'whole' | 'text' | 'id';

/** The years a column of the database can hold. */
const isKept = (at: Date): boolean => at.getUTCFullYear() >= 1000 && at.getUTCFullYear() <= 9999;

const readings: Readonly<Record<CursorKind, (value: unknown) => unknown>> = {
  instant: (value) => {
    const at = new Date(typeof value === 'string' ? value : NaN);
    return isKept(at) ? at : undefined;
  },
  whole: (value) => (Number.isSafeInteger(value) ? value : undefined),
  text: (value) => (typeof value === 'string' ? value : undefined),
  id: (value) => (typeof value === 'string' && /^[0-9a-f-]{36}$/.test(value) ? value : undefined),
};

/** Where a page ended, for the query of the next: the values of its last row in the columns of the order. */
export const cursorAt = (values: readonly unknown[]): string =>
  Buffer.from(JSON.stringify(values)).toString('base64url');

function valuesIn(cursor: string): unknown[] {
  try {
    const values: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString());
    return Array.isArray(values) ? values : [];
  } catch {
    return [];
  }
}

/** The values a cursor was made of; refuses one that `cursorAt` did not make for these columns. */
export function readCursor(cursor: string, kinds: readonly CursorKind[]): unknown[] {
  const values = valuesIn(cursor);
  const read = kinds.map((kind, at) => readings[kind](values[at]));
  if (values.length === kinds.length && !read.includes(undefined)) return read;
  const complaint = { path: ['query', 'cursor'], code: 'entry-wrong-form', values: {} } as const;
  throw new Rejection('invalid', 'problem-invalid', { complaints: [complaint] });
}
