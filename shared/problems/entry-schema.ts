import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';

/** The kinds of entry every feature uses: written once, so that a rule and its words are the same everywhere. */

const hasNoControls = (text: string) => !/[\u0000-\u0008\u000b-\u001f\u007f]/.test(text);
const hasNoLineBreaks = (text: string) => !/[\r\n\t]/.test(text);

/** One line of text that must be filled in. */
export const nameEntry = (maximum = 120) =>
  z
    .string()
    .trim()
    .min(1)
    .max(maximum)
    .refine((text) => hasNoControls(text) && hasNoLineBreaks(text), complain('entry-wrong-form'));

/** One line of text that may be empty. */
export const lineEntry = (maximum = 200) =>
  z
    .string()
    .trim()
    .max(maximum)
    .refine((text) => hasNoControls(text) && hasNoLineBreaks(text), complain('entry-wrong-form'));

/** Text of several lines that may be empty. */
export const textEntry = (maximum = 4000) =>
  z.string().max(maximum).refine(hasNoControls, complain('entry-wrong-form'));

export const idEntry = z.uuid();
/** The id of an item of a rate card: a slug or a UUID. */
export const itemIdEntry = z.string().regex(/^[a-z0-9][a-z0-9-]{0,63}$/);
export const emailEntry = z.string().trim().toLowerCase().max(254).pipe(z.email());
export const optionalEmailEntry = z.union([z.literal(''), emailEntry]);

/** A web address or mail link; anything but http, https and mailto is refused. */
export const linkEntry = z
  .string()
  .trim()
  .max(500)
  .refine((text) => text === '' || /^(https?:\/\/|mailto:)[^\s<>"']+$/i.test(text), complain('entry-not-link'));

export const dayEntry = z.iso.date();
export const percentEntry = z.number().min(0).max(100);
export const countEntry = z.int().min(1).max(10_000);
/** A decimal amount as text, never negative, at most nine digits before and six after the sign. */
export const decimalEntry = z.string().regex(/^\d{1,9}(\.\d{1,6})?$/);
/** A decimal amount as text that may be negative. */
export const signedDecimalEntry = z.string().regex(/^-?\d{1,9}(\.\d{1,6})?$/);
export const versionEntry = z.int().min(0);
