import { csvText, type CsvCell } from '#shared/documents/csv-text';
import type { Journal, JournalInCurrency } from '#shared/invoices/payment-schema';
import { currencyDigits } from '#shared/money/currency-digits';
import type { MinorUnits } from '#shared/money/decimal';
import { sumMinor } from '#shared/money/sum-minor';
import { textOf } from '#shared/money/text-of';
import { formula, NameBook, Sheet, workbookBytes, type PaperWords } from '../documents';

const kindWords = {
  invoice: 'journal-kind-invoice',
  'credit-note': 'journal-kind-credit-note',
  payment: 'journal-kind-payment',
  refund: 'journal-kind-refund',
  dispute: 'journal-kind-dispute',
  'write-off': 'journal-kind-write-off',
} as const;

/** A journal and the words its files are written in. */
export interface JournalInWords {
  readonly journal: Journal;
  readonly words: PaperWords;
}

type Amounts = Pick<JournalInCurrency['totals'][number], 'net_minor' | 'tax_minor' | 'rounding_minor' | 'amount_minor'>;

/** The entries of one currency and the words they are written in. */
interface BookInWords {
  readonly book: JournalInCurrency;
  readonly words: PaperWords;
}

const heads = ({ say }: PaperWords): string[] => [
  say('journal-head-day'),
  say('journal-head-kind'),
  say('journal-head-number'),
  say('journal-head-client'),
  say('journal-head-note'),
  say('journal-head-way'),
  say('journal-head-paid'),
  say('journal-head-currency'),
  say('journal-head-net'),
  say('journal-head-tax'),
  say('journal-head-rounding'),
  say('journal-head-amount'),
];

/** Where the four amounts stand. */
const amountColumns = 'IJKL';

const wayWords = { bank: 'journal-way-bank', cash: 'journal-way-cash', card: 'journal-way-card' } as const;

const minorsOf = (amounts: Amounts): MinorUnits[] => [
  ...[amounts.net_minor, amounts.tax_minor, amounts.rounding_minor, amounts.amount_minor],
];

/** With all decimals of the currency, as books are read into other programs. */
const decimalsOf = (amounts: Amounts, currency: string): CsvCell[] =>
  minorsOf(amounts).map((minor) => ({ amount: textOf(minor, currencyDigits(currency)) }));

/** The exact decimal as a figure: at most 13 digits and its decimals, which a figure of this kind holds without loss. */
const figuresOf = (amounts: Amounts, currency: string): number[] =>
  minorsOf(amounts).map((minor) => Number(textOf(minor, currencyDigits(currency))));

function together({ totals }: JournalInCurrency): Amounts {
  const sum = (pick: (amounts: Amounts) => MinorUnits) => sumMinor(totals.map(pick));
  return {
    net_minor: sum((total) => total.net_minor),
    tax_minor: sum((total) => total.tax_minor),
    rounding_minor: sum((total) => total.rounding_minor),
    amount_minor: sum((total) => total.amount_minor),
  };
}

const entryTexts = ({ book, words }: BookInWords, entry: JournalInCurrency['entries'][number]): string[] => [
  ...[entry.day, words.say(kindWords[entry.kind]), entry.number, entry.clientName, entry.note],
  ...[entry.paid ? words.say(wayWords[entry.paid.way]) : '', entry.paid?.invoices.join(', ') ?? '', book.currency],
];

const totalTexts = ({ book, words }: BookInWords, kind: string): string[] => [
  ...[words.say('journal-totals'), kind, '', '', '', '', '', book.currency],
];

function bookRows(written: BookInWords): CsvCell[][] {
  const { book, words } = written;
  const { currency } = book;
  return [
    ...book.entries.map((entry) => [...entryTexts(written, entry), ...decimalsOf(entry, currency)]),
    ...book.totals.map((total) => [
      ...totalTexts(written, words.say(kindWords[total.kind])),
      ...decimalsOf(total, currency),
    ]),
    [...totalTexts(written, words.say('journal-all')), ...decimalsOf(together(book), currency)],
  ];
}

/** The journal as comma-separated values: for each currency every entry, then the sums of each kind, then all together. */
export const journalCsv = ({ journal, words }: JournalInWords): string =>
  csvText([heads(words), ...journal.currencies.flatMap((book) => bookRows({ book, words }))]);

/** The sums are formulas over the entries, so that whoever changes or filters them sees what it comes to. */
function addTotals(sheet: Sheet, written: BookInWords, span: { from: number; to: number }): void {
  const { book, words } = written;
  const range = (column: string) => `$${column}$${span.from}:$${column}$${span.to}`;
  for (const total of book.totals) {
    const sums = figuresOf(total, book.currency).map((value, place) =>
      formula(`SUMIF(${range('B')},$B$${sheet.next},${range(amountColumns[place])})`, value),
    );
    sheet.add([...totalTexts(written, words.say(kindWords[total.kind])), ...sums], 'sum');
  }
  const sums = figuresOf(together(book), book.currency).map((value, place) =>
    formula(`SUM(${range(amountColumns[place])})`, value),
  );
  sheet.add([...totalTexts(written, words.say('journal-all')), ...sums], 'sum');
}

function newSheet(name: string, currency: string): Sheet {
  const digits = currencyDigits(currency);
  const format = digits === 0 ? '#,##0' : `#,##0.${'0'.repeat(digits)}`;
  const texts = [12, 14, 20, 34, 28, 14, 24, 10].map((width) => ({ width, format: '' }));
  return new Sheet(name, [...texts, ...[14, 14, 12, 14].map((width) => ({ width, format }))]);
}

function sheetOf(written: BookInWords, name: string, title: string): Sheet {
  const { book, words } = written;
  const { currency, entries } = book;
  const sheet = newSheet(name, currency);
  sheet.head(title, words.say('journal-note', { currency }), heads(words));
  const from = sheet.next;
  for (const entry of entries) sheet.add([...entryTexts(written, entry), ...figuresOf(entry, currency)]);
  const to = Math.max(from, sheet.next - 1);
  if (entries.length === 0) sheet.add(['']);
  addTotals(sheet, written, { from, to });
  return sheet;
}

/** The journal as a workbook, a sheet for each currency; the same journal at the same time gives the same bytes. */
export function journalWorkbook(
  { journal, words }: JournalInWords,
  marks: { author: string; madeAt: Date; paper: 'A4' | 'Letter' },
): Promise<Buffer> {
  const title = words.say('journal-title', { from: words.day(journal.from), to: words.day(journal.to) });
  const isSingle = journal.currencies.length === 1;
  const sheets = journal.currencies.map((book) => {
    const { currency } = book;
    return sheetOf({ book, words }, words.say(isSingle ? 'journal-sheet' : 'journal-sheet-in', { currency }), title);
  });
  return workbookBytes({ sheets, names: new NameBook() }, { title, ...marks });
}
