import { CdkDrag, type CdkDragDrop, CdkDropList } from '@angular/cdk/drag-drop';
import {
  ChangeDetectionStrategy,
  Component,
  ElementRef,
  Injector,
  afterNextRender,
  booleanAttribute,
  computed,
  inject,
  input,
  model,
  output,
  signal,
} from '@angular/core';
import { decimalSign } from '#shared/units/decimal-sign';
import { ungrouped } from '#shared/units/ungrouped';
import { Formats } from '../../core/formats/formats';
import { Figure } from '../figure/figure';
import { Grip } from '../order/grip';
import type { EditedCell, FigureColumn, MovedRow, PastedCells } from './figure-column';
import { ghostFractions } from './ghost-fraction';
import { placeAfter, type GridPlace } from './grid-place';
import { pastedLines } from './pasted-lines';

/** A dense table of figures: arrow keys move, Enter or typing edits a cell, rows of a spreadsheet can be pasted at one; rows change places by their grip or by Alt and the arrows. */
@Component({
  selector: 'app-figure-table',
  imports: [CdkDrag, CdkDropList, Figure, Grip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './figure-table.html',
  styleUrl: './figure-table.scss',
})
export class FigureTable<Row> {
  private readonly formats = inject(Formats);
  private readonly injector = inject(Injector);
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);

  readonly caption = input.required<string>();
  readonly captionShown = input(false, { transform: booleanAttribute });
  readonly columns = input.required<readonly FigureColumn<Row>[]>();
  readonly rows = input.required<readonly Row[]>();
  readonly rowId = input.required<(row: Row) => string>();
  /** Rows that stand over those below them, which are then set in. */
  readonly isHead = input<(row: Row) => boolean>();
  /** The bottom line, by the keys of the columns. */
  readonly totals = input<Readonly<Record<string, string>>>();
  /** Rows can be chosen; the chosen one is tinted. */
  readonly selectable = input(false, { transform: booleanAttribute });
  readonly chosen = model<string>();
  /** Rows can change places. */
  readonly movable = input(false, { transform: booleanAttribute });
  readonly edited = output<EditedCell>();
  readonly pasted = output<PastedCells>();
  readonly moved = output<MovedRow>();

  protected readonly place = signal<GridPlace>({ row: 0, column: 0 });
  protected readonly draft = signal<string | undefined>(undefined);
  protected readonly lines = computed(() =>
    this.rows().map((row, index) => {
      const isHead = this.isHead()?.(row);
      return { row, id: this.rowId()(row), isHead, cells: this.cellsOf(row, index) };
    }),
  );
  protected readonly footer = computed(() =>
    this.columns().map((column, index) => ({
      column,
      text: this.totals()?.[column.key] ?? '',
      ghost: this.ghostOf(index, this.rows().length),
    })),
  );
  private readonly ghosts = computed(() =>
    this.columns().map((column) => {
      const texts = [...this.rows().map((row) => column.text(row)), this.totals()?.[column.key] ?? ''];
      return column.kind === 'figure' ? ghostFractions(texts, decimalSign(this.formats.locale())) : texts.map(() => '');
    }),
  );

  protected isAt(row: number, column: number): boolean {
    return this.place().row === row && this.place().column === column;
  }

  protected choose(id: string, place: GridPlace): void {
    this.place.set(place);
    if (this.selectable()) this.chosen.set(id);
  }

  protected press(event: KeyboardEvent): void {
    if (event.altKey) this.pressWithAlt(event);
    if (event.altKey || event.metaKey) return;
    const isWritten = event.key.length === 1 && event.key !== ' ' && !event.ctrlKey;
    // The editor has opened but is not there yet: fast fingers lose nothing.
    const draft = this.draft();
    if (draft !== undefined) {
      if (event.key.length === 1 && !event.ctrlKey) this.draft.set(`${draft}${event.key}`);
      else this.pressInEditor(event, draft);
      return;
    }
    const next = placeAfter(event.ctrlKey ? `Control+${event.key}` : event.key, this.place(), this.size());
    if (next) this.move(next);
    else if (event.key === 'Enter' || event.key === 'F2') this.open();
    else if (isWritten && this.isEditable()) this.begin(event.key);
    else return;
    event.preventDefault();
    this.focusCell();
  }

  private pressWithAlt(event: KeyboardEvent): void {
    const by = { ArrowUp: -1, ArrowDown: 1 }[event.key];
    const from = this.place().row;
    if (!by || !this.movable() || this.draft() !== undefined) return;
    event.preventDefault();
    this.shift(from, from + by);
    this.focusCell();
  }

  protected drop({ previousIndex, currentIndex }: CdkDragDrop<unknown>): void {
    this.shift(previousIndex, currentIndex);
  }

  /** The cell one stands at goes along with its row. */
  private shift(from: number, to: number): void {
    const line = this.lines().at(from);
    if (!line || to < 0 || to >= this.size().rows || from === to) return;
    this.moved.emit({ rowId: line.id, from, to });
    this.move({ ...this.place(), row: to });
  }

  protected pressInEditor(event: KeyboardEvent, text: string): void {
    event.stopPropagation();
    const { row, column } = this.place();
    const next = {
      Enter: { row: row + 1, column },
      Tab: { row, column: column + (event.shiftKey ? -1 : 1) },
      Escape: { row, column },
    }[event.key];
    if (!next) return;
    event.preventDefault();
    if (event.key === 'Escape') this.draft.set(undefined);
    else this.commit(text);
    this.move({
      row: Math.min(next.row, this.size().rows - 1),
      column: Math.max(0, Math.min(next.column, this.size().columns - 1)),
    });
    this.focusCell();
  }

  protected commit(text: string): void {
    if (this.draft() === undefined) return;
    this.draft.set(undefined);
    this.take(text);
  }

  /** Hands out what differs from what stands there. */
  protected take(text: string): void {
    const { line, column } = this.at();
    if (line && column && text !== this.typed(column, line.row))
      this.edited.emit({ rowId: line.id, key: column.key, text });
  }

  protected edit(place: GridPlace): void {
    this.move(place);
    this.open();
    this.focusCell();
  }

  protected paste(event: ClipboardEvent): void {
    const lines = pastedLines(event.clipboardData?.getData('text/plain') ?? '');
    const { line } = this.at();
    const isSingle = lines.length === 1 && lines[0].length === 1;
    if (!line || !this.isEditable() || (isSingle && this.draft() !== undefined)) return;
    event.preventDefault();
    this.draft.set(undefined);
    const keys = this.columns()
      .slice(this.place().column)
      .map(({ key }) => key);
    this.pasted.emit({ rowId: line.id, keys, lines });
  }

  private cellsOf(row: Row, index: number) {
    return this.columns().map((column, place) => ({
      column,
      text: column.text(row),
      minor: column.minor?.(row),
      explained: column.explained?.(row),
      remark: column.remark?.(row),
      ghost: this.ghostOf(place, index),
    }));
  }

  private ghostOf(column: number, row: number): string {
    return this.ghosts()[column][row];
  }

  private at() {
    const { row, column } = this.place();
    return { line: this.lines().at(row), column: this.columns().at(column) };
  }

  private size() {
    return { rows: this.rows().length, columns: this.columns().length };
  }

  /** What stands in a cell as somebody would type it: figures without grouping. */
  private typed(column: FigureColumn<Row>, row: Row): string {
    return column.kind === 'figure' ? ungrouped(column.text(row), this.formats.locale()) : column.text(row);
  }

  private isEditable(): boolean {
    return this.at().column?.editable === true;
  }

  private move(place: GridPlace): void {
    this.draft.set(undefined);
    this.place.set(place);
  }

  /** Typing begins an entry anew; where one chooses it only opens the choices. */
  private begin(key: string): void {
    if (this.at().column?.choices) this.open();
    else this.draft.set(key);
  }

  private open(): void {
    const { line, column } = this.at();
    if (!line || !column) return;
    if (column.editable) this.draft.set(this.typed(column, line.row));
    else if (column.explained?.(line.row))
      this.host.nativeElement.querySelector<HTMLElement>('td[tabindex="0"] app-figure button')?.click();
    else if (this.selectable()) this.chosen.set(line.id);
  }

  private focusCell(): void {
    const focus = () => {
      const cell = this.host.nativeElement.querySelector<HTMLElement>('[tabindex="0"]');
      (cell?.querySelector<HTMLElement>('input, select') ?? cell)?.focus();
    };
    afterNextRender(focus, { injector: this.injector });
  }
}
