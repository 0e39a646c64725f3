import type { en } from '#shared/words/en';

/** A code of the catalogue: what calculators, complaints and papers name instead of writing a sentence. */
export type WordCode = keyof typeof en;

/** The values a message is worded with; the ending of a name says the unit (`_mm`, `_mm2`, `_minor`, `_hours` …). */
export type WordValues = Readonly<Record<string, string | number>>;

/** A catalogue of one language: the same codes, other sentences. */
export type Catalogue = Readonly<Record<WordCode, string>>;
