import { Injectable, inject } from '@angular/core';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import type { EditedCell, PastedCells } from '../../ui/table/figure-column';
import { CardStore } from '../card/card-store';
import { CellWriting, type Cell } from './cell-writing';
import type { TableRow } from './table-columns';
import { withCell } from './with-cell';

/** A table that is typed or pasted into; `grow` makes a row for what is pasted beyond the last. */
export interface EnteredTable {
  readonly columns: readonly CardColumn[];
  readonly rows: readonly TableRow[];
  readonly grow?: (content: RateCard, at: number) => { readonly content: RateCard; readonly row: TableRow } | undefined;
}

interface Unreadable {
  readonly path: CellPath;
  readonly text: string;
  readonly message: string;
}

/** Takes what was typed or pasted into a table over into the card, a pasted block as one step. */
@Injectable()
export class TableEntries {
  private readonly store = inject(CardStore);
  private readonly writing = inject(CellWriting);

  edit({ columns, rows }: EnteredTable, { rowId, key, text }: EditedCell): void {
    const [row, column] = [rows.find(({ id }) => id === rowId), columns.find(({ field }) => field === key)];
    const content = this.store.content();
    if (!row || !column || !content) return;
    const path = row.path(column);
    const read = this.writing.read({ column, path }, text, content);
    if (read.ok) this.store.enterCell(path, read.value);
    else this.store.leaveUnread(path, { text, message: this.writing.complaint(read) });
  }

  paste(table: EnteredTable, { rowId, keys, lines }: PastedCells): void {
    const first = table.rows.findIndex(({ id }) => id === rowId);
    const before = this.store.content();
    if (first < 0 || !before) return;
    const unreadable: Unreadable[] = [];
    const after = lines.reduce((content, texts, at) => {
      const grown = this.rowAt(table, content, first + at);
      return grown ? this.line({ ...grown, columns: table.columns, keys, texts }, unreadable) : content;
    }, before);
    this.store.enterContent(after);
    for (const { path, text, message } of unreadable) this.store.leaveUnread(path, { text, message });
  }

  private rowAt(table: EnteredTable, content: RateCard, at: number) {
    const row = table.rows.at(at);
    return at < table.rows.length && row ? { content, row } : table.grow?.(content, at);
  }

  private line(
    from: {
      readonly content: RateCard;
      readonly row: TableRow;
      readonly columns: readonly CardColumn[];
      readonly keys: readonly string[];
      readonly texts: readonly string[];
    },
    unreadable: Unreadable[],
  ): RateCard {
    const { row, columns, keys, texts } = from;
    return texts.reduce((content, text, at) => {
      const column = columns.find(({ field }) => field === keys[at]);
      return column ? this.cell({ column, path: row.path(column) }, { content, text }, unreadable) : content;
    }, from.content);
  }

  private cell(cell: Cell, { content, text }: { content: RateCard; text: string }, unreadable: Unreadable[]): RateCard {
    const read = this.writing.read(cell, text, content);
    if (read.ok) return withCell(content, cell.path, read.value);
    unreadable.push({ path: cell.path, text, message: this.writing.complaint(read) });
    return content;
  }
}
