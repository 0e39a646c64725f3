import {
  ChangeDetectionStrategy,
  Component,
  booleanAttribute,
  computed,
  inject,
  input,
  linkedSignal,
} from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { cardTables } from '#shared/rate-cards/tables/card-parts';
import type { CardColumn, CardList as CardListTable } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, listCellPath, type CellPath } from '#shared/rate-cards/tables/cell-path';
import { listRows, type ListRow } from '#shared/rate-cards/tables/list-rows';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { FormComplaint } from '../../ui/field/form-complaint';
import { FigureTable } from '../../ui/table/figure-table';
import { CardStore } from '../card/card-store';
import { columnSetsOf } from './column-sets';
import { copiedRow, newRow } from './new-row';
import { TableColumns, type TableRow } from './table-columns';
import { tableWidth_px } from './table-width';
import { TableEntries, type EnteredTable } from './table-entries';
import { withRow, withRowMoved, withoutRow } from './with-rows';

interface ListTableRow extends TableRow {
  readonly at: number;
  readonly rowPath: CellPath;
}

const isBelow = (path: CellPath, above: CellPath): boolean => above.every((part, at) => path[at] === part);
const keyOf = ({ path, ids }: ListRow, { hasIds }: CardListTable): string =>
  hasIds ? ids.join('/') : `${ids.join('/')}#${path.at(-1)}`;

/** Items of the card as a dense table: typed and pasted into, added to, moved about; what stands in the chosen one comes below. */
@Component({
  selector: 'app-card-list',
  imports: [FigureTable, FormComplaint, MatButton],
  providers: [TableColumns, TableEntries],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './card-list.html',
  styleUrl: './card-list.scss',
})
export class CardList {
  private readonly store = inject(CardStore);
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);
  private readonly tableColumns = inject(TableColumns);
  private readonly entries = inject(TableEntries);

  readonly table = input.required<CardListTable>();
  /** The way to the item whose rows these are; empty for a list of the card itself. */
  readonly within = input<CellPath>([]);
  readonly caption = input.required<string>();
  /** Fewer columns than the table has. */
  readonly columns = input<readonly CardColumn[]>();
  /** What stands in a row is shown elsewhere. */
  readonly flat = input(false, { transform: booleanAttribute });

  private readonly list = computed<CellPath>(() => [
    ...this.within(),
    ...fieldsOf(this.table().place.split('.*.').at(-1) ?? ''),
  ]);
  private readonly modelRows = computed(
    () => new Map(listRows(this.table(), this.store.model()).map((row) => [keyOf(row, this.table()), row.path])),
  );
  protected readonly isEditable = this.store.isEditable;
  protected readonly rows = computed<readonly ListTableRow[]>(() => {
    const [table, model] = [this.table(), this.modelRows()];
    return listRows(table, this.store.content())
      .filter(({ path }) => isBelow(path, this.list()))
      .map((row) => this.tableRow(row, model.get(keyOf(row, table))));
  });
  protected readonly sets = computed(() =>
    columnSetsOf(this.columns() ?? this.table().columns).map(({ columns, heading }) => ({
      caption: heading ? `${this.caption()}: ${heading}` : this.caption(),
      isNamed: heading !== '' || (this.within().length > 0 && !this.flat()),
      width_px: tableWidth_px(columns.length),
      columns: this.tableColumns.of(columns),
      entered: { columns, rows: this.rows(), grow: (content, at) => this.grown(content, at) } satisfies EnteredTable,
    })),
  );
  /** The chosen row stays the chosen one while it is there. */
  protected readonly chosenId = linkedSignal<readonly ListTableRow[], string | undefined>({
    source: this.rows,
    computation: (rows, before) => (rows.some(({ id }) => id === before?.value) ? before?.value : rows[0]?.id),
  });
  readonly chosen = computed(() => this.rows().find(({ id }) => id === this.chosenId()));
  protected readonly complaints = computed(() => this.store.remarks().ofList(this.list()));
  /** Choosing a row is for something: to move it about, or to see what stands in it. */
  protected readonly isChoosing = computed(() => this.isEditable() || this.flat() || this.inner().length > 0);
  /** The lists that stand in each row, for the chosen one. */
  protected readonly inner = computed(() => {
    const chosen = this.chosen();
    if (!chosen || this.flat()) return [];
    const name = this.nameOf(chosen);
    return cardTables.flatMap((table) =>
      table.kind === 'list' && table.within === this.table().id
        ? [{ table, path: chosen.rowPath, caption: `${this.words.say(table.heading)}: ${name}` }]
        : [],
    );
  });

  protected readonly idOf = ({ id }: ListTableRow): string => id;

  nameOf({ rowPath }: ListTableRow): string {
    const name = valueAt(this.store.content(), [...rowPath, 'name']);
    return typeof name === 'string' ? name : '';
  }

  protected edit(table: EnteredTable, cell: Parameters<TableEntries['edit']>[1]): void {
    this.entries.edit(table, cell);
  }

  protected paste(table: EnteredTable, cells: Parameters<TableEntries['paste']>[1]): void {
    this.store.settle(this.list());
    this.entries.paste(table, cells);
  }

  protected add(): void {
    const content = this.store.content();
    const row = content && this.begun(content);
    if (row) this.put(row, (this.chosen()?.at ?? this.rows().length - 1) + 1);
  }

  protected duplicate({ rowPath, at }: ListTableRow): void {
    this.put(copiedRow(valueAt(this.store.content(), rowPath) as object), at + 1);
  }

  protected remove({ at }: ListTableRow): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(this.list());
    this.store.enterContent(withoutRow(content, this.list(), at));
    this.chosenId.set((this.rows()[at] ?? this.rows().at(-1))?.id);
  }

  protected move({ at, id }: ListTableRow, by: 1 | -1): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(this.list());
    this.store.enterContent(withRowMoved(content, this.list(), { from: at, to: at + by }));
    this.chosenId.set(this.table().hasIds ? id : this.rows()[at + by]?.id);
  }

  private begun(content: RateCard): object | undefined {
    return newRow(this.table().id, content, this.formats.lengthUnit());
  }

  private put(row: object, at: number): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(this.list());
    this.store.enterContent(withRow(content, this.list(), { at, row }));
    this.chosenId.set(this.rows()[at]?.id);
  }

  /** A row for what is pasted below the last one. */
  private grown(content: RateCard, at: number) {
    const row = this.begun(content);
    if (!row) return undefined;
    const path = [...this.list(), at];
    return { content: withRow(content, this.list(), { at, row }), row: this.tableRow({ path, ids: [] }, undefined) };
  }

  private tableRow(row: ListRow, modelPath: CellPath | undefined): ListTableRow {
    return {
      id: keyOf(row, this.table()),
      at: Number(row.path.at(-1)),
      rowPath: row.path,
      path: (column: CardColumn) => listCellPath(row.path, column),
      modelPath: (column: CardColumn) => modelPath && listCellPath(modelPath, column),
    };
  }
}
