import * as z from 'zod';
import { complain } from '#shared/problems/complaints-of';
import { isWellFormed } from '#shared/problems/is-well-formed';

/** Control characters, signs that are none, and the marks that turn the direction of text: they have no place in a name, and could forge a header or a log line. */
const unseen = /[\u0000-\u001f\u007f-\u009f\u061c\u200e\u200f\u2028\u2029\u202a-\u202e\u2066-\u2069\ufffe\uffff]/;
const unseenButBreaks =
  /[\u0000-\u0008\u000b\u000c\u000e-\u001f\u007f-\u009f\u061c\u200e\u200f\u202a-\u202e\u2066-\u2069\ufffe\uffff]/;

/** Letters that are drawn as nothing (soft hyphens, spaces of no width, fillers): alone they make no text. */
const onlyUndrawn = /^[\s\p{Default_Ignorable_Code_Point}\u2800]*$/u;
const withoutUndrawn = (text: string): string => (onlyUndrawn.test(text) && !unseen.test(text) ? '' : text);

/** Text of 0 to `maximum` characters just as it was typed, for what is read in another way or names something. */
export const asTyped = (maximum: number) => z.string().max(maximum).refine(isWellFormed, complain('entry-wrong-form'));

/** One line of text of 1 to `maximum` characters, trimmed, without control characters. */
export const line = (maximum: number) =>
  z
    .string()
    .trim()
    .overwrite(withoutUndrawn)
    .min(1)
    .max(maximum)
    .refine((text) => !unseen.test(text) && isWellFormed(text), complain('entry-wrong-form'));

/** One line of text that may be left empty. */
export const optionalLine = (maximum: number) =>
  z
    .string()
    .trim()
    .overwrite(withoutUndrawn)
    .max(maximum)
    .refine((text) => !unseen.test(text) && isWellFormed(text), complain('entry-wrong-form'));

/** Text of several lines that may be left empty, at most `maximum` characters. */
export const paragraphs = (maximum: number) =>
  z
    .string()
    .max(maximum)
    .refine((text) => !unseenButBreaks.test(text) && isWellFormed(text), complain('entry-wrong-form'));

/** Whether there is nothing to read in a text. */
export const isBlank = (text: string): boolean => onlyUndrawn.test(text);

/** An id: a UUID in small letters. */
export const identifier = z.uuid().regex(/^[0-9a-f-]{36}$/);

/** An e-mail address in small letters, at most 254 characters (RFC 5321). */
export const emailAddress = z.string().trim().toLowerCase().min(1).max(254).pipe(z.email());

const isWebAddress = (text: string): boolean =>
  /^(https?:\/\/[^\s/?#@]+|mailto:[^\s@]+@[^\s@]+)[^\s]*$/i.test(text) && !unseen.test(text) && isWellFormed(text);

/** An address a page may link to: http, https or mailto only. */
export const webAddress = z.string().trim().max(2_000).refine(isWebAddress, complain('entry-not-link'));

/** An instant in UTC as ISO 8601 text. */
export const instant = z.iso.datetime();

/** The version a row carries, raised by each change. */
export const version = z.int().min(1);

/** An e-mail address that may be left empty. */
export const optionalEmailAddress = z
  .string()
  .trim()
  .toLowerCase()
  .max(254)
  .refine((text) => text === '' || emailAddress.safeParse(text).success, complain('entry-not-email'));

/** An address a page may link to, or nothing. */
export const optionalWebAddress = z
  .string()
  .trim()
  .max(2_000)
  .refine((text) => text === '' || isWebAddress(text), complain('entry-not-link'));

/** The version a change starts from; 0 where there was no row yet. */
export const versionSeen = z.int().min(0);

/** A day as YYYY-MM-DD. */
export const day = z.iso.date();

/** How many identical ones: 1 to 10,000. */
export const count = z.int().min(1).max(10_000);
