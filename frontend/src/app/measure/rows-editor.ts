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
  output,
} from '@angular/core';
import { MatButton, MatIconButton } from '@angular/material/button';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Icon } from '../ui/icon/icon';
import { EntryAt, type EntryChoice } from '../ui/field/entry-at';
import { StepButtons } from '../ui/order/step-buttons';
import type { ShapeEntry } from './shape-entries';

/** Another kind was chosen for a row. */
export interface PickedKind {
  readonly index: number;
  readonly kind: string;
}

/** A small table of entries: rows come, go and change places, by hand or by keys (Alt and the arrows). */
@Component({
  selector: 'app-rows-editor',
  imports: [EntryAt, Icon, MatButton, MatIconButton, StepButtons],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './rows-editor.html',
  styleUrl: './rows-editor.scss',
})
export class RowsEditor {
  private readonly host = inject<ElementRef<HTMLElement>>(ElementRef);
  private readonly injector = inject(Injector);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the list stands in the document. */
  readonly path = input.required<string>();
  readonly caption = input.required<string>();
  readonly headings = input.required<readonly string[]>();
  /** The entries of one row under the headings; undefined leaves a place empty. Their paths start at the row. */
  readonly cells = input.required<(row: unknown, index: number) => readonly (ShapeEntry | undefined)[]>();
  /** What a row can be, where it can be several things; it then stands in the first column. */
  readonly kinds = input<readonly EntryChoice[]>();
  readonly kindOf = input<(row: unknown) => string>(() => '');
  readonly addLabel = input.required<string>();
  readonly least = input(1);
  /** The last row stands on top, as a profile is built from below. */
  readonly upwards = input(false, { transform: booleanAttribute });
  readonly fixedOrder = input(false, { transform: booleanAttribute });
  readonly isDisabled = input(false);
  readonly added = output<number>();
  readonly kindPicked = output<PickedKind>();

  protected readonly rows = computed(() => {
    const rows = this.form()
      .items(this.path())
      .map((control, index) => {
        const row = this.form().value<unknown>(`${this.path()}.${index}`);
        return {
          control,
          index,
          path: `${this.path()}.${index}`,
          kind: this.kindOf()(row),
          cells: this.cells()(row, index),
        };
      });
    return this.upwards() ? rows.reverse() : rows;
  });
  protected readonly complaint = computed(() => this.form().message(this.path()));

  protected at(path: string, entry: ShapeEntry): string {
    return entry.path ? `${path}.${entry.path}` : path;
  }

  protected press(event: KeyboardEvent, index: number): void {
    const by = { ArrowUp: -1, ArrowDown: 1 }[event.key];
    if (!by || !event.altKey || this.fixedOrder()) return;
    event.preventDefault();
    this.shift(index, by);
  }

  protected shift(index: number, by: number): void {
    const to = index + (this.upwards() ? -by : by);
    if (to < 0 || to >= this.rows().length) return;
    this.form().move(this.path(), index, to);
    this.focusRow(to);
  }

  protected remove(index: number): void {
    this.form().remove(this.path(), index);
    this.focusRow(Math.max(0, index - 1));
  }

  protected add(): void {
    const index = this.rows().length;
    this.added.emit(index);
    this.focusRow(index);
  }

  protected pick(index: number, kind: string): void {
    this.kindPicked.emit({ index, kind });
  }

  private focusRow(index: number): void {
    const focus = () =>
      this.host.nativeElement.querySelector<HTMLElement>(`tr[data-row="${index}"] :is(input, select)`)?.focus();
    afterNextRender(focus, { injector: this.injector });
  }
}
