import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { cellAt } from '#shared/rate-cards/tables/cell-at';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import type { CellPath } from '#shared/rate-cards/tables/cell-path';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { Formats } from '../../core/formats/formats';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { CardStore } from '../card/card-store';
import { CellWriting, type Cell } from './cell-writing';

/** One figure, text or choice of the card with its label, entered beside what it was in the card the draft was copied from. */
@Component({
  selector: 'app-card-entry',
  imports: [Entry, Field],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './card-entry.html',
  styleUrl: './card-entry.scss',
})
export class CardEntry {
  private readonly store = inject(CardStore);
  private readonly writing = inject(CellWriting);
  private readonly formats = inject(Formats);

  readonly column = input.required<CardColumn>();
  readonly path = input.required<CellPath>();
  /** The way to the same value in the card the draft was copied from, where it stands elsewhere. */
  readonly modelPath = input<CellPath>();
  readonly label = input<string>();

  private readonly cell = computed<Cell>(() => ({ column: this.column(), path: this.path() }));
  private readonly value = computed(() => valueAt(this.store.content(), this.path()));
  protected readonly isEditable = this.store.isEditable;
  protected readonly heading = computed(() => this.label() ?? this.writing.heading(this.column()));
  protected readonly unit = computed(() => this.writing.unit(this.column(), this.value()));
  protected readonly isFigure = computed(() => ['number', 'decimal', 'hundredths'].includes(this.column().kind));
  protected readonly complaint = computed(() => this.store.remarks().of(this.path()));
  protected readonly text = computed(() => {
    const content = this.store.content();
    const unread = this.store.remarks().textOf(this.path());
    return unread ?? (content ? this.writing.text(this.cell(), content) : '');
  });
  /** What stands there for those who only read it. */
  protected readonly known = computed(() => {
    const [text, unit] = [this.text(), this.unit()];
    // The sign of a share stands where the locale has it.
    if (text && unit === '%') return this.formats.percent(1).replace('1', text);
    return [text, text ? unit : ''].filter(Boolean).join(' ');
  });
  protected readonly choices = computed(() => {
    const content = this.store.content();
    const choices = content && this.writing.choices(this.cell(), content);
    return choices?.map((choice) => ({ ...choice, isChosen: choice.value === this.value() }));
  });
  /** What may be ticked, where several things may be chosen. */
  protected readonly several = computed(() => {
    if (this.column().kind !== 'choices') return undefined;
    const chosen = (this.value() as readonly string[] | undefined) ?? [];
    return this.writing.several(this.column()).map((choice) => ({
      ...choice,
      isChosen: chosen.includes(choice.value as string),
    }));
  });
  protected readonly was = computed(() => {
    const [model, path] = [this.store.model(), this.modelPath() ?? this.path()];
    if (!model || !cellAt(path)) return '';
    const before = valueAt(model, path);
    if (before === undefined || JSON.stringify(before) === JSON.stringify(this.value())) return '';
    const text = this.writing.valueText({ column: this.column(), path }, before, model);
    return $localize`was ${text || '–'}:before:`;
  });

  protected enter(text: string): void {
    const content = this.store.content();
    if (!content || text === this.text()) return;
    const read = this.writing.read(this.cell(), text, content);
    if (read.ok) this.store.enterCell(this.path(), read.value);
    else this.store.leaveUnread(this.path(), { text, message: this.writing.complaint(read) });
  }

  protected choose(index: number): void {
    const choice = this.choices()?.[index];
    if (choice) this.store.enterCell(this.path(), choice.value);
  }

  protected tick(value: unknown, isChosen: boolean): void {
    const all = this.several() ?? [];
    const values = all.filter((one) => (one.value === value ? isChosen : one.isChosen)).map((one) => one.value);
    this.store.enterCell(this.path(), values);
  }
}
