import { compareDays } from '#shared/calendar/add-days';
import type { SnapshotWorkshop } from '#shared/estimates/snapshot';
import type { Statement } from '#shared/invoices/payment-schema';
import {
  addressBlock,
  finishedPaper,
  letterheadBlock,
  paperWords,
  printableLogo,
  sectionBlocks,
  tableBlock,
  textBlock,
  textStyles,
  type Block,
  type PaperWords,
  type Pdf,
  type TableColumn,
  type TableRow,
} from '../../documents';

/** What a statement is set from. */
export interface StatementOnPaper {
  readonly workshop: SnapshotWorkshop;
  readonly logo: Buffer | null;
  readonly address: readonly string[];
  readonly statement: Statement;
  /** Instant in UTC (ISO 8601), and its day in the workshop's zone. */
  readonly madeAt: string;
  readonly madeOn: string;
}

const ledgerWords = {
  invoice: 'ledger-invoice',
  'credit-note': 'ledger-credit-note',
  payment: 'ledger-payment',
  refund: 'ledger-refund',
  dispute: 'ledger-dispute',
  'write-off': 'ledger-write-off',
} as const;

const columns = ({ say }: PaperWords): TableColumn[] => [
  { head: say('paper-statement-column-day'), width: 'fit' },
  { head: say('paper-statement-column-what'), width: 'rest' },
  { head: say('paper-statement-column-amount'), width: 'fit', align: 'right' },
  { head: say('paper-statement-column-balance'), width: 'fit', align: 'right' },
];

const balanceRow = (text: string, amount: string, above: TableRow['above']): TableRow => ({
  cells: [
    { text, span: 3, isRowHead: true, style: textStyles.strong },
    { text: amount, style: textStyles.strong },
  ],
  above,
});

type Account = Statement['currencies'][number];

function rows(
  { from, to }: Statement,
  { opening_minor, closing_minor, lines }: Account,
  words: PaperWords,
): TableRow[] {
  const { say, money, day } = words;
  return [
    balanceRow(say('paper-statement-opening', { day: day(from) }), money(opening_minor), 'hair'),
    ...lines.map((line): TableRow => ({
      cells: [
        { text: day(line.day) },
        { text: say(ledgerWords[line.kind], { number: line.number }), isRowHead: true },
        { text: money(line.amount_minor) },
        { text: money(line.balance_minor) },
      ],
      above: 'hair',
    })),
    balanceRow(say('paper-statement-closing', { day: day(to) }), money(closing_minor), 'gold'),
  ];
}

/** A table for each currency, named where there are several. */
function accountBlocks(pdf: Pdf, { statement, workshop }: StatementOnPaper): Block[] {
  const isSingle = statement.currencies.length === 1;
  return statement.currencies.flatMap((account) => {
    const words = paperWords({ ...workshop, currency: account.currency });
    const table = tableBlock(pdf, columns(words), rows(statement, account, words));
    if (isSingle) return [table];
    return sectionBlocks(pdf, words.say('paper-statement-in', { currency: account.currency }), [table]);
  });
}

/** Nothing is known of days ahead: a statement reaches to the day it is made on at most. */
function untilToday(paper: StatementOnPaper): StatementOnPaper {
  const { statement, madeOn } = paper;
  const to = compareDays(statement.to, madeOn) > 0 ? madeOn : statement.to;
  return { ...paper, statement: { ...statement, to } };
}

const titleOf = ({ statement: { clientName, from, to } }: StatementOnPaper, words: PaperWords): string =>
  words.say('paper-statement-title', { client: clientName, from: words.day(from), to: words.day(to) });

function blocks(pdf: Pdf, paper: StatementOnPaper, words: PaperWords): Block[] {
  const { statement, workshop, logo, address, madeOn } = paper;
  return [
    letterheadBlock({ workshop, logo: printableLogo(pdf, logo), words }),
    addressBlock(pdf, {
      address: [statement.clientName, ...address],
      particulars: [[words.say('paper-date'), words.day(madeOn)]],
    }),
    textBlock(pdf, titleOf(paper, words), { style: textStyles.title, tag: 'H1' }),
    ...accountBlocks(pdf, paper),
  ];
}

/** The account of a client on paper. */
export function statementPaper(asked: StatementOnPaper): Promise<Buffer> {
  const paper = untilToday(asked);
  const words = paperWords(paper.workshop);
  const title = titleOf(paper, words);
  return finishedPaper({
    facts: {
      ...{ title, author: paper.workshop.name, subject: words.say('paper-statement'), language: words.language },
      size: paper.workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
      madeAt: paper.madeAt,
    },
    feet: {
      head: title,
      foot: `${paper.workshop.name} · ${title}`,
      pageOf: (page, pages) => words.say('paper-page-of', { page, pages }),
    },
    blocks: (pdf) => blocks(pdf, paper, words),
  });
}
