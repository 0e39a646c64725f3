import { type PaymentRow, paymentRows } from '#shared/documents/payment-rows';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { tableBlock, type TableColumn, type TableRow } from '../paper/table-block';
import { textBlock } from '../paper/text-block';
import type { PaperWords } from '../paper-words';
import type { IssueContent } from './issue-content';

function rowName({ say }: PaperWords, row: PaymentRow): string {
  if (row.of === 'deposit') return say('paper-stage-deposit');
  if (row.of === 'stage') return row.name === '' ? say('paper-stage-whole') : row.name;
  return say(row.of === 'first-release' ? 'paper-stage-first-release' : 'paper-stage-second-release');
}

/** A column of the plan: its head, and what a row says in it. */
interface PlanColumn extends TableColumn {
  readonly text: (row: PaymentRow) => string;
}

const amountOr = (words: PaperWords, amount_minor: number, sign: 'plain' | 'less'): string => {
  if (amount_minor === 0) return '';
  const amount = words.money(amount_minor);
  return sign === 'less' ? words.say('paper-less', { amount }) : amount;
};

/** Only the columns a plan needs: without a deposit nothing is recovered, without retention nothing held back. */
function planColumns(words: PaperWords, rows: readonly PaymentRow[]): PlanColumn[] {
  const { say, money } = words;
  const figures = (head: string, text: PlanColumn['text']): PlanColumn => ({
    head,
    text,
    width: 'fit',
    align: 'right',
  });
  const share = (row: PaymentRow) => (row.share_percent === null ? '' : words.figure('percent', row.share_percent));
  const isAny = (pick: (row: PaymentRow) => number) => rows.some((row) => pick(row) !== 0);
  const recovered = figures(say('paper-column-recovered'), (row) => amountOr(words, row.recovered_minor, 'less'));
  const retained = figures(say('paper-column-retained'), (row) => amountOr(words, row.retained_minor, 'less'));
  const [isRecovered, isRetained] = [isAny((row) => row.recovered_minor), isAny((row) => row.retained_minor)];
  const worth = figures(say('paper-column-worth'), (row) => amountOr(words, row.work_minor, 'plain'));
  return [
    { head: say('paper-column-stage'), width: 'rest', text: (row) => rowName(words, row) },
    figures(say('paper-column-share'), share),
    ...(isRecovered || isRetained ? [worth] : []),
    ...(isRecovered ? [recovered] : []),
    ...(isRetained ? [retained] : []),
    figures(say('paper-column-paid'), (row) => money(row.paid_minor)),
  ];
}

function planRow(columns: readonly PlanColumn[], row: PaymentRow): TableRow {
  return { cells: columns.map((column, place) => ({ text: column.text(row), isRowHead: place === 0 })), above: 'hair' };
}

/** What is taken away has no plan: it is given back. */
function takenAwayBlocks(pdf: Pdf, { words, snapshot, taxed }: IssueContent): Block[] {
  const amount = words.money(Math.abs(snapshot.figures.price.gross_minor));
  return sectionBlocks(pdf, words.say('paper-payment'), [
    textBlock(pdf, words.say('paper-takes-away', { amount, taxed })),
  ]);
}

/** The plan of payment: deposit, stages, releases, and the total they come to. */
export function paymentBlocks(pdf: Pdf, content: IssueContent): Block[] {
  const { words, draft, snapshot, taxed } = content;
  if (snapshot.figures.price.gross_minor < 0) return takenAwayBlocks(pdf, content);
  const { rows, sum_minor } = paymentRows(draft.settings.stages, snapshot.figures.stages);
  const columns = planColumns(words, rows);
  const total: TableRow = {
    cells: [
      { text: words.say('paper-total'), style: textStyles.strong, span: columns.length - 1, isRowHead: true },
      { text: words.money(sum_minor), style: textStyles.strong },
    ],
    above: 'strong',
  };
  const planned = rows.map((row) => planRow(columns, row));
  const isShort = planned.length <= 12;
  const kept = planned.map((row, place) => ({ ...row, keepsWithNext: isShort || place === planned.length - 1 }));
  return sectionBlocks(pdf, words.say('paper-payment'), [
    tableBlock(pdf, columns, [...kept, total]),
    textBlock(pdf, words.say('paper-payment-note', { taxed }), { style: textStyles.note, before_pt: 3 }),
  ]);
}
