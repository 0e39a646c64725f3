import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { BandLength, BandPart, BandShape } from '#shared/measure/band-shape';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { EntryAt } from '../ui/field/entry-at';
import { ChoiceEntry } from './choice-entry';
import { offeredIn } from './first-shape';
import { type PickedKind, RowsEditor } from './rows-editor';
import type { ShapeEntry } from './shape-entries';

const straight: BandPart = { part: 'straight', length_mm: 500 };
const curve: BandPart = { part: 'curve', radius_mm: 200, angle_degrees: 90 };

const cells: Readonly<Record<BandPart['part'], readonly (ShapeEntry | undefined)[]>> = {
  straight: [{ path: 'length_mm', label: $localize`Length`, way: 'length' }, undefined],
  curve: [
    { path: 'radius_mm', label: $localize`Radius`, way: 'length' },
    { path: 'angle_degrees', label: $localize`Angle`, way: 'number', unit: '°' },
  ],
};

/** How long a rim is: taken with a tape, or put together from straight and curved parts; and how it is cut. */
@Component({
  selector: 'app-band-editor',
  imports: [ChoiceEntry, EntryAt, RowsEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './band-editor.html',
})
export class BandEditor {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the band stands in the document. */
  readonly path = input.required<string>();
  readonly isDisabled = input(false);

  protected readonly by = computed(() => this.form().value<BandLength>(`${this.path()}.length`)?.by);
  protected readonly isCut = computed(() => this.form().value<BandShape>(this.path())?.stretch_mm !== undefined);
  protected readonly ways = [
    { value: 'tape', label: $localize`with a tape round it` },
    { value: 'parts', label: $localize`part by part` },
  ];
  protected readonly kinds = [
    { value: 'straight', label: $localize`straight` },
    { value: 'curve', label: $localize`curve` },
  ];
  protected readonly headings = [$localize`Part`, $localize`Length or radius`, $localize`Angle`];
  protected readonly cells = (row: unknown) => cells[(row as BandPart).part];
  protected readonly kindOf = (row: unknown): string => (row as BandPart).part;

  protected at(name: string): string {
    return `${this.path()}.${name}`;
  }

  protected change(by: string): void {
    const next: BandLength =
      by === 'tape' ? { by: 'tape', length_mm: 2000 } : { by: 'parts', parts: [straight, curve, straight, curve] };
    this.form().put(this.at('length'), this.offered(next));
  }

  protected add(index: number): void {
    this.form().insert(this.at('length.parts'), index, this.offered(straight));
  }

  protected pick({ index, kind }: PickedKind): void {
    this.form().put(this.at(`length.parts.${index}`), this.offered(kind === 'curve' ? curve : straight));
  }

  protected cut(isCut: boolean): void {
    const { stretch_mm } = this.offered({ stretch_mm: 700 });
    if (isCut) this.form().put(this.at('stretch_mm'), stretch_mm);
    else this.form().drop(this.at('stretch_mm'));
  }

  private offered<T>(value: T): T {
    return offeredIn(this.formats.lengthUnit(), value);
  }
}
