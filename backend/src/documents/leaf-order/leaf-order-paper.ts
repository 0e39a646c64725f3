import type { LeafOrderLine } from '#shared/documents/leaf-order-lines';
import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Snapshot } from '#shared/estimates/snapshot';
import { currencyDigits } from '#shared/money/currency-digits';
import { minorOf } from '#shared/money/minor-of';
import { sumMinor } from '#shared/money/sum-minor';
import { addressBlock } from '../address-block';
import { paperNames } from '../estimate/paper-names';
import { letterheadBlock, printableLogo } from '../letterhead';
import { finishedPaper } from '../paper/finished-paper';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { tableBlock, type TableRow } from '../paper/table-block';
import { textBlock } from '../paper/text-block';
import { paperWords, type PaperWords } from '../paper-words';
import { packsText } from './packs-text';

function orderRow(line: LeafOrderLine, { words, digits }: { words: PaperWords; digits: number }): TableRow {
  const { product, needLeaves, spareLeaves, purchase, price_minor } = line;
  const price = words.money(minorOf(product.price, digits));
  const note = words.say('paper-order-list', { price, form: product.form, leaves: product.leavesPerBooklet });
  const figures = [needLeaves, spareLeaves, purchase.booklets].map((figure) => words.figure('number', figure));
  return {
    cells: [
      { text: product.name, note, style: textStyles.medium, isRowHead: true },
      ...figures.map((text) => ({ text })),
      { text: packsText(line, words) },
      { text: words.money(price_minor) },
    ],
    above: 'hair',
    keepsWithNext: false,
  };
}

function orderTable(pdf: Pdf, lines: readonly LeafOrderLine[], at: { words: PaperWords; digits: number }): Block {
  const { words } = at;
  const { say, money } = words;
  const rows = lines.map((line) => orderRow(line, at));
  const kept = rows.map((row, place) => ({ ...row, keepsWithNext: place === rows.length - 1 }));
  const total: TableRow = {
    cells: [
      { text: say('paper-order-total'), style: textStyles.strong, span: 5, isRowHead: true },
      { text: money(sumMinor(lines.map((line) => line.price_minor))), style: textStyles.strong },
    ],
    above: 'gold',
  };
  const columns = [
    { head: say('paper-order-product'), width: 'rest' },
    { head: say('paper-order-need'), width: 'fit', align: 'right' },
    { head: say('paper-order-spare-leaves'), width: 'fit', align: 'right' },
    { head: say('paper-order-booklets'), width: 'fit', align: 'right' },
    { head: say('paper-order-bought'), width: 110 },
    { head: say('paper-column-price'), width: 'fit', align: 'right' },
  ] as const;
  return tableBlock(pdf, columns, [...kept, total]);
}

/** Sample boards take leaf that no zone asks for; whoever orders has to know of it. */
function sampleNotes(pdf: Pdf, { draft, choice }: Snapshot, words: PaperWords): Block[] {
  const { extras } = chosenDraft(draft, choice).settings;
  const names = extras.flatMap((extra) => (extra.kind === 'labour' && extra.work === 'sample' ? [extra.name] : []));
  return names.length === 0
    ? []
    : [textBlock(pdf, words.say('paper-order-samples', { names: names.join(', ') }), { before_pt: 10 })];
}

function orderBlocks(
  pdf: Pdf,
  snapshot: Snapshot,
  at: { lines: readonly LeafOrderLine[]; logo: Buffer | null },
): Block[] {
  const { workshop, card, job, estimate, issuedOn } = snapshot;
  const words = paperWords(workshop);
  const { orderPercentile: percentile, spare_percent } = card.leaf;
  const note = words.say('paper-order-note', { percentile, spare_percent });
  return [
    letterheadBlock({ workshop, logo: printableLogo(pdf, at.logo), words }),
    addressBlock(pdf, {
      address: [],
      particulars: [
        [words.say('paper-job'), [job.number, job.title].filter(Boolean).join(', ')],
        [paperNames(snapshot, words).kind, words.say('paper-number-letter', { ...estimate })],
        [words.say('paper-date'), words.day(issuedOn)],
      ],
    }),
    textBlock(pdf, words.say('paper-order-title'), { style: textStyles.title, tag: 'H1' }),
    ...(at.lines.length === 0
      ? [textBlock(pdf, words.say('paper-order-none'), { before_pt: 8 })]
      : [
          textBlock(pdf, note, { before_pt: 4 }),
          orderTable(pdf, at.lines, { words, digits: currencyDigits(workshop.currency) }),
        ]),
    ...(at.lines.length === 0
      ? []
      : [textBlock(pdf, words.say('paper-order-batch'), { before_pt: 10, style: textStyles.medium })]),
    ...sampleNotes(pdf, snapshot, words),
  ];
}

/** The leaf order as a paper for the workshop: what to buy, how it comes cheapest, one batch for the whole job. */
export function leafOrderPaper(
  snapshot: Snapshot,
  at: { readonly lines: readonly LeafOrderLine[]; readonly logo: Buffer | null },
): Promise<Buffer> {
  const { workshop, estimate, issuedAt } = snapshot;
  const words = paperWords(workshop);
  const title = words.say('paper-order-head', { ...estimate });
  return finishedPaper({
    facts: {
      title,
      author: workshop.name,
      subject: words.say('paper-order-title'),
      language: words.language,
      size: workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
      madeAt: issuedAt,
    },
    feet: {
      head: title,
      foot: `${workshop.name} · ${title}`,
      pageOf: (page, pages) => words.say('paper-page-of', { page, pages }),
    },
    blocks: (pdf) => orderBlocks(pdf, snapshot, at),
  });
}
