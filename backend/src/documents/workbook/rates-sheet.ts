import type { PaperWords } from '../paper-words';
import type { NameBook } from './name-book';
import { input, Sheet } from './sheet';

/** A figure of the rate card as it stands on its sheet. */
export interface RateFigure {
  readonly label: string;
  readonly value: number;
  readonly unit: string;
  /** What its name is made of; ids and plain words. */
  readonly name: readonly string[];
}

const figureColumn = 2;

/** The rates by themselves: one figure a row, each with a name the other sheets call it by. */
export class RatesSheet extends Sheet {
  constructor(
    private readonly names: NameBook,
    words: PaperWords,
  ) {
    const text = { width: 46, format: '' };
    super(words.say('sheet-rates'), [text, { width: 16, format: '#,##0.00####' }, { width: 22, format: '' }, text]);
    const heads = ['what', 'figure', 'unit', 'name'] as const;
    this.head(
      words.say('sheet-rates'),
      words.say('sheet-rates-note'),
      heads.map((head) => words.say(`sheet-head-${head}`)),
    );
  }

  /** Begins a part of the card. */
  part(title: string): void {
    this.add([]);
    this.add([title], 'part');
  }

  /** Writes a figure and gives the name formulas call it by. */
  rate({ label, value, unit, name }: RateFigure): string {
    const known = this.names.add(name, this.at(figureColumn, this.next));
    this.add([label, input(value), unit, known]);
    return known;
  }
}
