import { Injectable, inject } from '@angular/core';
import type { CardDifference, CardValue } from '#shared/rate-cards/card-differences';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { cardParts } from '#shared/rate-cards/tables/card-parts';
import type { CardColumn, CardTable } from '#shared/rate-cards/tables/card-table';
import { cellAt, differencePath, listAt, type ShownCell } from '#shared/rate-cards/tables/cell-at';
import { Words } from '../../core/formats/words';
import { CellWriting } from '../cells/cell-writing';

/** One line of difference in the trade's words. */
export interface WrittenDifference {
  readonly item: string;
  readonly what: string;
  readonly before: string;
  readonly after: string;
}

/** The differences of one part of the card. */
export interface DifferenceGroup {
  readonly partId: string;
  readonly name: string;
  readonly lines: readonly WrittenDifference[];
}

/** The two cards that are compared: an item is called there what it is called there. */
export interface Compared {
  readonly before: RateCard;
  readonly after: RateCard;
}

const nothing = '–';

/** Everything of a card that another place of it may name. */
const namedIn = ({ money, leaf, carving, buildUps }: RateCard) => [
  ...[...money.grades, ...money.taxCategories, ...leaf.products, ...carving.timbers],
  ...[...buildUps.materials, ...buildUps.recipes, ...buildUps.buildUps.flatMap(({ steps }) => steps)],
];

/** Words differences between cards as somebody of the trade would tell them. */
@Injectable({ providedIn: 'root' })
export class DifferenceWriting {
  private readonly words = inject(Words);
  private readonly writing = inject(CellWriting);

  groups(differences: readonly CardDifference[], compared: Compared): DifferenceGroup[] {
    const written = differences.map((difference) => this.written(difference, compared));
    return cardParts.flatMap(({ id, heading, tables }) => {
      const lines = written.filter(({ table }) => table && tables.includes(table)).map(({ line }) => line);
      return lines.length > 0 ? [{ partId: id, name: this.words.say(heading), lines }] : [];
    });
  }

  private written(difference: CardDifference, compared: Compared): { table?: CardTable; line: WrittenDifference } {
    const path = differencePath(difference);
    const cell = difference.field === '' ? undefined : cellAt(path);
    const table = cell?.table ?? listAt(path);
    const line = cell ? this.figure(difference, cell, compared) : this.row(difference, table);
    return { ...(table ? { table } : {}), line };
  }

  /** A row added, removed or moved, or a list of lines that have no names. */
  private row({ kind, itemName, before, after }: CardDifference, table: CardTable | undefined): WrittenDifference {
    const item = itemName || (table ? this.words.say(table.heading) : '');
    switch (kind) {
      case 'added':
        return { item, what: $localize`new`, before: '', after: '' };
      case 'removed':
        return { item, what: $localize`taken away`, before: '', after: '' };
      case 'moved':
        return { item, what: $localize`place in the list`, before: String(before), after: String(after) };
      case 'changed':
        return { item, what: '', before: String(before ?? nothing), after: String(after ?? nothing) };
    }
  }

  private figure(difference: CardDifference, cell: ShownCell, compared: Compared): WrittenDifference {
    const { column, row, table } = cell;
    const rowName = row?.words.map((word) => this.words.say(word)).join(', ') ?? '';
    const isWithin = table.kind === 'list' && !table.hasIds;
    const place = isWithin ? this.words.say(table.heading) : '';
    const unit = this.writing.unit(column);
    const heading = this.writing.heading(column);
    return {
      item: [difference.itemName, rowName, place].filter(Boolean).join(' · '),
      what: unit ? `${heading}, ${unit}` : heading,
      before: this.value(column, difference.before, compared.before),
      after: this.value(column, difference.after, compared.after),
    };
  }

  private value(column: CardColumn, value: CardValue, content: RateCard): string {
    if (value === null) return nothing;
    if (column.kind === 'item') return namedIn(content).find(({ id }) => id === value)?.name ?? String(value);
    const shown = column.kind === 'choices' ? [value] : value;
    return this.writing.valueText({ column, path: [] }, shown, content) || nothing;
  }
}
