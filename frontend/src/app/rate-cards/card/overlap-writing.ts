import { Injectable, inject } from '@angular/core';
import { cardDifferences, type CardDifference } from '#shared/rate-cards/card-differences';
import { DifferenceWriting, type WrittenDifference } from '../changes/difference-writing';
import type { CardEntries } from '../rate-card-calls';

/** One line both sides changed, in words. */
export interface WrittenOverlap {
  readonly key: string;
  readonly item: string;
  readonly what: string;
  readonly mine: string;
  readonly theirs: string;
}

/** The draft with one line as one side or the other has it, everything else alike. */
export interface OverlapSides {
  readonly mine: CardEntries;
  readonly theirs: CardEntries;
}

const isThere = $localize`stays`;
const isGone = $localize`taken away`;

/** Both sides of a row that only one of them has. */
const rowSides: Partial<Record<CardDifference['kind'], Pick<WrittenOverlap, 'mine' | 'theirs'>>> = {
  added: { mine: isThere, theirs: isGone },
  removed: { mine: isGone, theirs: isThere },
};

/** Words the lines two people changed at once. */
@Injectable({ providedIn: 'root' })
export class OverlapWriting {
  private readonly writing = inject(DifferenceWriting);

  line(key: string, { mine, theirs }: OverlapSides): WrittenOverlap {
    if (key === 'name')
      return { key, item: $localize`Name of the card`, what: '', mine: mine.name, theirs: theirs.name };
    const differences = cardDifferences(theirs.content, mine.content);
    const compared = { before: theirs.content, after: mine.content };
    const written = this.writing.groups(differences, compared).flatMap(({ lines }) => lines);
    const [first = { item: '', what: '' }] = written;
    const row = differences.length === 1 ? rowSides[differences[0].kind] : undefined;
    if (row) return { key, item: first.item, what: '', ...row };
    return { key, item: first.item, ...this.sides(written) };
  }

  /** A line of one figure, or several figures that go together. */
  private sides(written: readonly WrittenDifference[]): Pick<WrittenOverlap, 'what' | 'mine' | 'theirs'> {
    const [first] = written;
    if (written.length === 1) return { what: first.what, mine: first.after, theirs: first.before };
    const told = (side: 'before' | 'after') => written.map((line) => `${line.what}: ${line[side] || '–'}`).join('; ');
    return { what: '', mine: told('after'), theirs: told('before') };
  }
}
