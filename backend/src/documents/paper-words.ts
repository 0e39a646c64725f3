import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import { formatDay } from '#shared/calendar/format-day';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { formatsFor } from '#shared/units/formats-for';
import { en } from '#shared/words/en';
import { say, type ValueFormats } from '#shared/words/say';
import { unprintedLetters } from '#shared/words/unprinted-letters';
import type { WordCode, WordValues } from '#shared/words/word-code';

/** What a paper is worded with: the codes of the catalogue, and figures as the workshop writes them. */
export interface PaperWords {
  /** BCP 47 of the words themselves, whatever the workshop's locale. */
  readonly language: string;
  readonly say: (code: WordCode, values?: WordValues) => string;
  readonly money: (amount_minor: MinorUnits) => string;
  readonly length: (length_mm: number) => string;
  /** Any other figure by the ending of its name: hours, percent, leaves … */
  readonly figure: (unit: string, figure: number) => string;
  readonly day: (day: string) => string;
}

/** Papers are worded in the one language there is; a workshop that writes English keeps its own kind of it. */
const languageOf = (locale: string): string => (/^en\b/i.test(locale) ? locale : 'en-GB');

/** A day as the workshop's pages show it, unless the fonts of the papers lack a letter of it. */
function printedDay(day: string, locale: string): string {
  const written = formatDay(day, locale);
  return unprintedLetters(written).length === 0 ? written : formatDay(day, languageOf(locale));
}

/** Figures as the workshop writes them; amounts bear their currency's code where the fonts of the papers lack its sign. */
function printedFormats({ locale, currency, lengthUnit }: SnapshotWorkshop): ValueFormats {
  const settings = { locale, currency, lengthUnit, digits: currencyDigits(currency) };
  const formats = formatsFor(settings);
  const isPrinted = unprintedLetters(formats.write('minor', -1)).length === 0;
  return isPrinted ? formats : formatsFor({ ...settings, currencyDisplay: 'code' });
}

/** The words of a workshop's papers. */
export function paperWords(workshop: SnapshotWorkshop): PaperWords {
  const formats = printedFormats(workshop);
  const language = languageOf(workshop.locale);
  return {
    language,
    say: say(en, formats),
    money: (amount_minor) => formats.write('minor', amount_minor),
    length: (length_mm) => formats.write('mm', length_mm),
    figure: (unit, figure) => formats.write(unit, figure),
    day: (day) => printedDay(day, workshop.locale),
  };
}
