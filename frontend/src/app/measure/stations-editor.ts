import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { Corner } from '#shared/measure/flat-shape';
import type { Station } from '#shared/measure/leg-shape';
import type { LengthUnit } from '#shared/units/length-unit';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { offeredIn } from './first-shape';
import { RowsEditor } from './rows-editor';
import type { ShapeEntry } from './shape-entries';

type StationsWay = 'girths' | 'stations' | 'corners';

interface ListWords {
  readonly caption: string;
  readonly addLabel: string;
  readonly headings: readonly string[];
  readonly cells: readonly ShapeEntry[];
  readonly least: number;
  /** What follows the last rows, in round figures of a unit where nothing says how far. */
  readonly next: (rows: readonly unknown[], unit: LengthUnit) => unknown;
}

const further = (rows: readonly unknown[], unit: LengthUnit): Station => {
  const [before, last] = [rows.at(-2) as Station | undefined, rows.at(-1) as Station];
  const step_mm = before ? last.at_mm - before.at_mm : offeredIn(unit, { step_mm: 100 }).step_mm;
  return { at_mm: last.at_mm + step_mm, girth_mm: last.girth_mm };
};

const cornerOn = (rows: readonly unknown[], unit: LengthUnit): Corner => {
  const { x_mm, y_mm } = rows.at(-1) as Corner;
  return { x_mm: x_mm - offeredIn(unit, { step_mm: 50 }).step_mm, y_mm };
};

const lists: Readonly<Record<StationsWay, ListWords>> = {
  girths: {
    caption: $localize`Girths at equal distances, from one end to the other`,
    addLabel: $localize`Two more girths`,
    headings: [$localize`Girth`],
    cells: [{ path: '', label: $localize`Girth`, way: 'length' }],
    least: 3,
    next: (rows) => rows.at(-1),
  },
  stations: {
    caption: $localize`Girths where they were taken`,
    addLabel: $localize`Another girth`,
    headings: [$localize`At`, $localize`Girth`],
    cells: [
      { path: 'at_mm', label: $localize`At`, way: 'length' },
      { path: 'girth_mm', label: $localize`Girth`, way: 'length' },
    ],
    least: 2,
    next: further,
  },
  corners: {
    caption: $localize`Corners, in order round the edge`,
    addLabel: $localize`Another corner`,
    headings: [$localize`To the right`, $localize`Up`],
    cells: [
      { path: 'x_mm', label: $localize`To the right`, way: 'displacement' },
      { path: 'y_mm', label: $localize`Up`, way: 'displacement' },
    ],
    least: 3,
    next: cornerOn,
  },
};

/** Girths along a leg, or the corners of a drawn face, as a table. */
@Component({
  selector: 'app-stations-editor',
  imports: [RowsEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-rows-editor
      [caption]="list().caption"
      [addLabel]="list().addLabel"
      [headings]="list().headings"
      [cells]="cells()"
      [least]="list().least"
      [form]="form()"
      [path]="path()"
      [isDisabled]="isDisabled()"
      (added)="add($event)"
    />
  `,
})
export class StationsEditor {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the list stands in the document. */
  readonly path = input.required<string>();
  readonly way = input.required<StationsWay>();
  readonly isDisabled = input(false);

  protected readonly list = computed(() => lists[this.way()]);
  protected readonly cells = computed(() => {
    const { cells } = this.list();
    return () => cells;
  });

  /** Equally spaced girths come in pairs, so that their number stays odd. */
  protected add(index: number): void {
    const rows = this.form().value<readonly unknown[]>(this.path()) ?? [];
    const next = this.list().next(rows, this.formats.lengthUnit());
    this.form().insert(this.path(), index, next);
    if (this.way() === 'girths' && rows.length % 2 === 1) this.form().insert(this.path(), index + 1, next);
  }
}
