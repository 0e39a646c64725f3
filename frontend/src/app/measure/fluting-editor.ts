import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { Fluting } from '#shared/measure/fluting';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { EntryAt } from '../ui/field/entry-at';
import { offeredIn } from './first-shape';
import type { ShapeEntry } from './shape-entries';

const start: Fluting = { cut: 'flutes', width_mm: 8, depth_mm: 4, between_mm: 3, share_percent: 100 };

const entries: readonly ShapeEntry[] = [
  {
    path: 'cut',
    label: $localize`Cut as`,
    way: 'choice',
    choices: [
      { value: 'flutes', label: $localize`flutes` },
      { value: 'reeds', label: $localize`reeds` },
      { value: 'v-grooves', label: $localize`V grooves` },
    ],
  },
  { path: 'width_mm', label: $localize`Width of one`, way: 'length' },
  { path: 'depth_mm', label: $localize`Depth`, way: 'length' },
  { path: 'between_mm', label: $localize`Left between two`, way: 'length' },
  { path: 'share_percent', label: $localize`Share of the surface`, way: 'percent' },
];

/** Flutes, reeds or grooves along a surface, where there are any. */
@Component({
  selector: 'app-fluting-editor',
  imports: [EntryAt],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <label class="choice">
      <input #fluted type="checkbox" [checked]="isFluted()" [disabled]="isDisabled()" (change)="turn(fluted.checked)" />
      <span i18n>Fluted, reeded or grooved</span>
    </label>
    @if (isFluted()) {
      <div class="fields">
        @for (entry of entries; track entry.path) {
          <app-entry-at
            [form]="form()"
            [path]="path() + '.fluting.' + entry.path"
            [way]="entry.way"
            [label]="entry.label"
            [choices]="entry.choices ?? []"
          />
        }
      </div>
    }
  `,
})
export class FlutingEditor {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the shape stands in the document. */
  readonly path = input.required<string>();
  readonly isDisabled = input(false);

  protected readonly entries = entries;
  protected readonly isFluted = computed(() => this.form().value<Fluting>(`${this.path()}.fluting`) !== undefined);

  protected turn(isFluted: boolean): void {
    if (isFluted) this.form().put(`${this.path()}.fluting`, offeredIn(this.formats.lengthUnit(), start));
    else this.form().drop(`${this.path()}.fluting`);
  }
}
