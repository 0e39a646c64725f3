import { formatsFor } from '#shared/units/formats-for';
import { en } from '#shared/words/en';
import { say, type ValueFormats } from '#shared/words/say';

/** How figures are written where nobody's workshop is known: refusals of strangers, and mails. */
const plainFormats = formatsFor({ locale: 'en-GB', lengthUnit: 'mm', currency: 'EUR', digits: 2 });

export type Words = ReturnType<typeof wordsFor>;

/** Words codes in the language of the server, with figures as somebody's workshop writes them. */
export const wordsFor = (formats: ValueFormats) => say(en, formats);

export const words: Words = wordsFor(plainFormats);
