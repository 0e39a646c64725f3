import { csvText } from '#shared/documents/csv-text';
import type { LeafOrderLine } from '#shared/documents/leaf-order-lines';
import { textOf } from '#shared/money/text-of';
import type { PaperWords } from '../paper-words';
import { packsText } from './packs-text';

/** What a list of leaf is written with: its words, and the currency with its decimals. */
export interface ListSetting {
  readonly words: PaperWords;
  readonly currency: string;
  readonly digits: number;
}

function heads({ say }: PaperWords, currency: string): string[] {
  return [
    say('paper-order-product'),
    say('paper-order-metal'),
    say('paper-order-form'),
    say('paper-order-side'),
    say('paper-order-need'),
    say('paper-order-spare-leaves'),
    say('paper-order-in-booklet'),
    say('paper-order-booklets'),
    say('paper-order-bought'),
    say('paper-order-list-price', { currency }),
    say('paper-order-price', { currency }),
  ];
}

/** The leaf order as comma-separated values: figures plain, with a full stop, for a sheet or a supplier's form. */
export function leafOrderList(lines: readonly LeafOrderLine[], { words, currency, digits }: ListSetting): Buffer {
  const rows = lines.map((line) => {
    const { name, metal, form, side_mm, leavesPerBooklet, price } = line.product;
    return [
      ...[name, words.say('paper-order-metal-name', { metal }), words.say('paper-order-form-name', { form })],
      ...[side_mm, line.needLeaves, line.spareLeaves, leavesPerBooklet, line.purchase.booklets],
      packsText(line, words),
      Number(price),
      Number(textOf(line.price_minor, digits)),
    ];
  });
  return Buffer.from(csvText([heads(words, currency), ...rows]), 'utf8');
}
