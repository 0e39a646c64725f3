import { Injectable, inject } from '@angular/core';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import type { FigureColumn } from '../../ui/table/figure-column';
import { CardStore } from '../card/card-store';
import { CellWriting } from './cell-writing';

/** A row of a table: its id there, and the ways to its cells, here and in the card the draft was copied from. */
export interface TableRow {
  readonly id: string;
  readonly path: (column: CardColumn) => CellPath;
  readonly modelPath: (column: CardColumn) => CellPath | undefined;
}

/** The columns of a card's table as the table of figures takes them: how each reads, is edited, and what it was. */
@Injectable()
export class TableColumns {
  private readonly store = inject(CardStore);
  private readonly writing = inject(CellWriting);

  of(columns: readonly CardColumn[]): FigureColumn<TableRow>[] {
    const isEditable = this.store.isEditable();
    return columns.map((column) => this.column(column, isEditable));
  }

  private column(column: CardColumn, isEditable: boolean): FigureColumn<TableRow> {
    const unit = this.writing.unit(column);
    const heading = this.writing.heading(column);
    const isFigure = ['number', 'decimal', 'hundredths'].includes(column.kind);
    const isChosen = ['choice', 'item', 'yes-no'].includes(column.kind);
    return {
      key: column.field,
      heading: unit ? `${heading}, ${unit}` : heading,
      kind: isFigure ? 'figure' : 'text',
      text: (row) => this.text(column, row),
      minor: (row) => this.was(column, row),
      remark: (row) => this.store.remarks().of(row.path(column)),
      editable: isEditable,
      ...(isChosen ? { choices: (row: TableRow) => this.choices(column, row) } : {}),
    };
  }

  private text(column: CardColumn, row: TableRow): string {
    const [content, path] = [this.store.content(), row.path(column)];
    if (!content) return '';
    return this.store.remarks().textOf(path) ?? this.writing.text({ column, path }, content);
  }

  private choices(column: CardColumn, row: TableRow): string[] {
    const content = this.store.content();
    const choices = content && this.writing.choices({ column, path: row.path(column) }, content);
    return (choices ?? []).map(({ label }) => label);
  }

  private was(column: CardColumn, row: TableRow): string {
    const [model, path] = [this.store.model(), row.modelPath(column)];
    if (!model || !path) return '';
    const before = valueAt(model, path);
    if (before === valueAt(this.store.content(), row.path(column))) return '';
    const text = this.writing.valueText({ column, path }, before, model);
    return $localize`was ${text || '–'}:before:`;
  }
}
