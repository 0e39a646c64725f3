import { ChangeDetectionStrategy, Component, inject, input } from '@angular/core';
import type { ProfileElement } from '#shared/measure/profile-element';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { newId } from '../core/new-id';
import { changedElement, nextElement } from './changed-element';
import { elementKinds, elementNames } from './element-names';
import { offeredIn } from './first-shape';
import { type PickedKind, RowsEditor } from './rows-editor';
import type { ShapeEntry } from './shape-entries';

const height: ShapeEntry = { path: 'height_mm', label: $localize`Height`, way: 'length' };
const projection: ShapeEntry = { path: 'projection_mm', label: $localize`Projection`, way: 'length' };
const going: ShapeEntry = {
  path: 'going',
  label: $localize`Going upwards`,
  way: 'choice',
  choices: [
    { value: 'out', label: $localize`out` },
    { value: 'in', label: $localize`in` },
  ],
};
const up: ShapeEntry = { path: 'up_mm', label: $localize`Up`, way: 'displacement' };
const across: ShapeEntry = { path: 'across_mm', label: $localize`Out`, way: 'displacement' };
const bow: ShapeEntry = { path: 'bow_mm', label: $localize`Bow, round or (negative) hollow`, way: 'displacement' };

/** Half-rounds end where they began, whichever way one reads them. */
const halfRounds: readonly string[] = ['bead', 'astragal', 'torus'];

function cellsOf(row: unknown): readonly (ShapeEntry | undefined)[] {
  const { element } = row as ProfileElement;
  if (element === 'line') return [up, across, undefined];
  if (element === 'arc') return [up, across, bow];
  return [height, projection, halfRounds.includes(element) ? undefined : going];
}

/** A profile put together member by member; the table stands as the profile does, its foot at the bottom. */
@Component({
  selector: 'app-profile-editor',
  imports: [RowsEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-rows-editor
      upwards
      i18n-caption
      caption="Profile, from the top down"
      i18n-addLabel
      addLabel="Add on top"
      [form]="form()"
      [path]="path()"
      [headings]="headings"
      [kinds]="kinds"
      [kindOf]="kindOf"
      [cells]="cells"
      [isDisabled]="isDisabled()"
      (added)="add($event)"
      (kindPicked)="change($event)"
    />
  `,
})
export class ProfileEditor {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  readonly path = input.required<string>();
  readonly isDisabled = input(false);

  protected readonly headings = [
    $localize`Element`,
    $localize`Height`,
    $localize`Projection`,
    $localize`Direction or bow`,
  ];
  protected readonly kinds = elementKinds.map((value) => ({ value, label: elementNames[value] }));
  protected readonly cells = cellsOf;
  protected readonly kindOf = (row: unknown): string => (row as ProfileElement).element;

  protected add(index: number): void {
    const last = this.form().value<ProfileElement>(`${this.path()}.${index - 1}`);
    this.form().insert(this.path(), index, offeredIn(this.formats.lengthUnit(), nextElement(last, newId())));
  }

  protected change({ index, kind }: PickedKind): void {
    const path = `${this.path()}.${index}`;
    const before = this.form().value<ProfileElement>(path);
    if (before)
      this.form().put(path, changedElement(before, kind as ProfileElement['element'], this.formats.lengthUnit()));
  }
}
