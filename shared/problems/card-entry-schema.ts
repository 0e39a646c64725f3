import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';
import { line, optionalLine } from '#shared/problems/entry-schema';

/** The id of an item of a rate card: a readable slug of the start card, or a UUID of an item added later. */
export const cardItemId = z
  .string()
  .max(80)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/);

export const cardItemName = line(120);

/** A note, which may be left empty. */
export const cardNote = optionalLine(400);

/** A figure of at least 0 in whatever unit its name says. */
export const figure = z.number().min(0).max(1e6);

/** A factor: more than 0, at most 100. */
export const factorEntry = z.number().gt(0).max(100);

/** 0 to 100 percent as a plain number. */
export const percentEntry = z.number().min(0).max(100);

/** A loss: 0 to 90 percent. */
export const lossEntry = z.number().min(0).max(90);

/** A decimal of at least 0 written as text: up to 9 digits and 6 decimals, with a full stop. */
export const decimalEntry = z
  .string()
  .regex(/^\d{1,9}(\.\d{1,6})?$/, { abort: true, ...complain('entry-not-decimal') });

/** A decimal above 0 written as text. */
export const positiveDecimalEntry = decimalEntry.refine(
  (text) => Number(text) > 0,
  complain('entry-not-above', { minimum: 0 }),
);

/** A decimal percentage from 0 to 100 written as text. */
export const decimalPercentEntry = decimalEntry.refine(
  (text) => Number(text) <= 100,
  complain('entry-too-large', { maximum: 100 }),
);

/** Reports a complaint, made by `complain`, at a path below the value being checked. */
export function complainAt(
  context: z.core.$RefinementCtx,
  path: (string | number)[],
  { params, error }: ReturnType<typeof complain>,
): void {
  context.addIssue({ code: 'custom', path, params, message: error });
}

function idsAreUnique(items: readonly unknown[], context: z.core.$RefinementCtx): void {
  const seen = new Set<unknown>();
  items.forEach((item, at) => {
    const id = (item as { readonly id?: unknown } | null)?.id;
    if (id !== undefined && seen.has(id)) complainAt(context, [at, 'id'], complain('entry-twice'));
    seen.add(id);
  });
}

/** A list of items with ids, each id once; complains at the id that stands there again, even while other fields are wrong. */
export const itemList = <S extends z.ZodType>(item: S, maximum: number) =>
  z
    .array(item)
    .max(maximum)
    .superRefine(idsAreUnique, { when: ({ value }) => Array.isArray(value) });
