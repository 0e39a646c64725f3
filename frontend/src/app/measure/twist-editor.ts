import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { TwistedSection } from '#shared/measure/leg-shape';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { EntryAt } from '../ui/field/entry-at';
import { ChoiceEntry } from './choice-entry';
import { offeredIn } from './first-shape';
import type { ShapeEntry } from './shape-entries';

const starts: Readonly<Record<TwistedSection['outline'], TwistedSection>> = {
  lobed: { outline: 'lobed', radius_mm: 25, depth_mm: 10, lobes: 2 },
  square: { outline: 'square', across_mm: 40 },
};

const entries: Readonly<Record<TwistedSection['outline'], readonly ShapeEntry[]>> = {
  lobed: [
    { path: 'radius_mm', label: $localize`Mean radius`, way: 'length' },
    { path: 'depth_mm', label: $localize`Depth, crest to hollow`, way: 'length' },
    { path: 'lobes', label: $localize`Bines`, way: 'number' },
  ],
  square: [{ path: 'across_mm', label: $localize`Across the flats`, way: 'length' }],
};

/** The section of twisted work. */
@Component({
  selector: 'app-twist-editor',
  imports: [ChoiceEntry, EntryAt],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <div class="fields">
      <app-choice-entry
        i18n-label
        label="Section"
        [choices]="outlines"
        [chosen]="outline()"
        [isDisabled]="isDisabled()"
        (picked)="change($event)"
      />
      @for (entry of entries(); track entry.path) {
        <app-entry-at
          [form]="form()"
          [path]="path() + '.section.' + entry.path"
          [way]="entry.way"
          [label]="entry.label"
        />
      }
    </div>
  `,
})
export class TwistEditor {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the twisted member stands in the document. */
  readonly path = input.required<string>();
  readonly isDisabled = input(false);

  protected readonly outlines = [
    { value: 'lobed', label: $localize`wavy round` },
    { value: 'square', label: $localize`square` },
  ];
  protected readonly outline = computed(
    () => this.form().value<TwistedSection>(`${this.path()}.section`)?.outline ?? 'lobed',
  );
  protected readonly entries = computed(() => entries[this.outline()]);

  protected change(outline: string): void {
    const start = starts[outline as TwistedSection['outline']];
    this.form().put(`${this.path()}.section`, offeredIn(this.formats.lengthUnit(), start));
  }
}
