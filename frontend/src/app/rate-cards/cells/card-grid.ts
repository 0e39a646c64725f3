import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { CardGrid as CardGridTable } from '#shared/rate-cards/tables/card-table';
import { gridCellPath } from '#shared/rate-cards/tables/cell-path';
import { Words } from '../../core/formats/words';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { TableColumns, type TableRow } from './table-columns';
import { TableEntries } from './table-entries';
import { tableWidth_px } from './table-width';

interface GridTableRow extends TableRow {
  readonly name: string;
}

/** The same figures for each of a fixed set of things. */
@Component({
  selector: 'app-card-grid',
  imports: [FigureTable],
  providers: [TableColumns, TableEntries],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      [caption]="caption()"
      [columns]="columns()"
      [rows]="rows()"
      [rowId]="idOf"
      [style.max-width.px]="width_px()"
      (edited)="entries.edit(entered(), $event)"
      (pasted)="entries.paste(entered(), $event)"
    />
  `,
})
export class CardGrid {
  private readonly words = inject(Words);
  private readonly tableColumns = inject(TableColumns);
  protected readonly entries = inject(TableEntries);

  readonly table = input.required<CardGridTable>();
  readonly caption = input.required<string>();

  protected readonly rows = computed<readonly GridTableRow[]>(() =>
    this.table().rows.map((row) => ({
      id: row.key,
      name: row.words.map((word) => this.words.say(word)).join(', '),
      path: (column) => gridCellPath(row, column),
      modelPath: (column) => gridCellPath(row, column),
    })),
  );
  protected readonly columns = computed<readonly FigureColumn<GridTableRow>[]>(() => [
    { key: 'row', heading: this.caption(), kind: 'text', text: ({ name }) => name },
    ...this.tableColumns.of(this.table().columns),
  ]);
  protected readonly width_px = computed(() => tableWidth_px(this.columns().length));
  protected readonly entered = computed(() => ({ columns: this.table().columns, rows: this.rows() }));

  protected readonly idOf = ({ id }: GridTableRow): string => id;
}
