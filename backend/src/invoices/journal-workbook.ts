import { csvText, type CsvCell } from '#shared/documents/csv-text';
import type { Journal } from '#shared/invoices/payment-schema';
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

type Amounts = Pick<Journal['totals'][number], 'net_minor' | 'tax_minor' | 'rounding_minor' | 'amount_minor'>;

const heads = ({ say }: PaperWords): string[] => [
  say('journal-head-day'),
  say('journal-head-kind'),
  say('journal-head-number'),
  say('journal-head-client'),
  say('journal-head-net'),
  say('journal-head-tax'),
  say('journal-head-rounding'),
  say('journal-head-amount'),
];

/** The exact decimal as a figure: at most 13 digits and its decimals, which a figure of this kind holds without loss. */
const figuresOf = (amounts: Amounts, digits: number): number[] =>
  [amounts.net_minor, amounts.tax_minor, amounts.rounding_minor, amounts.amount_minor].map((minor) =>
    Number(textOf(minor, digits)),
  );

function together(journal: Journal): Amounts {
  const sum = (pick: (amounts: Amounts) => MinorUnits) => sumMinor(journal.totals.map(pick));
  return {
    net_minor: sum((total) => total.net_minor),
    tax_minor: sum((total) => total.tax_minor),
    rounding_minor: sum((total) => total.rounding_minor),
    amount_minor: sum((total) => total.amount_minor),
  };
}

/** The journal as comma-separated values: every entry, then the sums of each kind, then all together. */
export function journalCsv({ journal, words }: JournalInWords): string {
  const digits = currencyDigits(journal.currency);
  const entries = journal.entries.map((entry): CsvCell[] => [
    ...[entry.day, words.say(kindWords[entry.kind]), entry.number, entry.clientName],
    ...figuresOf(entry, digits),
  ]);
  const totals = journal.totals.map((total): CsvCell[] => [
    ...[words.say('journal-totals'), words.say(kindWords[total.kind]), '', ''],
    ...figuresOf(total, digits),
  ]);
  const all: CsvCell[] = [
    words.say('journal-totals'),
    words.say('journal-all'),
    '',
    '',
    ...figuresOf(together(journal), digits),
  ];
  return csvText([heads(words), ...entries, ...totals, all]);
}

/** The sums are formulas over the entries, so that whoever changes or filters them sees what it comes to. */
function addTotals(sheet: Sheet, { journal, words }: JournalInWords, span: { from: number; to: number }): void {
  const digits = currencyDigits(journal.currency);
  const range = (column: string) => `$${column}$${span.from}:$${column}$${span.to}`;
  for (const total of journal.totals) {
    const kind = words.say(kindWords[total.kind]);
    const sums = figuresOf(total, digits).map((value, place) =>
      formula(`SUMIF(${range('B')},$B$${sheet.next},${range('EFGH'[place])})`, value),
    );
    sheet.add([words.say('journal-totals'), kind, '', '', ...sums], 'sum');
  }
  const sums = figuresOf(together(journal), digits).map((value, place) =>
    formula(`SUM(${range('EFGH'[place])})`, value),
  );
  sheet.add([words.say('journal-totals'), words.say('journal-all'), '', '', ...sums], 'sum');
}

/** The journal as a workbook; the same journal at the same time gives the same bytes. */
export function journalWorkbook(
  { journal, words }: JournalInWords,
  marks: { author: string; madeAt: Date; paper: 'A4' | 'Letter' },
): Promise<Buffer> {
  const digits = currencyDigits(journal.currency);
  const format = digits === 0 ? '#,##0' : `#,##0.${'0'.repeat(digits)}`;
  const texts = [12, 14, 20, 34].map((width) => ({ width, format: '' }));
  const sheet = new Sheet(words.say('journal-sheet'), [
    ...texts,
    ...[14, 14, 12, 14].map((width) => ({ width, format })),
  ]);
  const title = words.say('journal-title', { from: words.day(journal.from), to: words.day(journal.to) });
  sheet.head(title, words.say('journal-note', { currency: journal.currency }), heads(words));
  const from = sheet.next;
  for (const entry of journal.entries) {
    const texts4 = [entry.day, words.say(kindWords[entry.kind]), entry.number, entry.clientName];
    sheet.add([...texts4, ...figuresOf(entry, digits)]);
  }
  const to = Math.max(from, sheet.next - 1);
  if (journal.entries.length === 0) sheet.add(['']);
  addTotals(sheet, { journal, words }, { from, to });
  return workbookBytes({ sheets: [sheet], names: new NameBook() }, { title, ...marks });
}
