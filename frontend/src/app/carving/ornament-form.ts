import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { OrnamentUse } from '#shared/carving/ornament-use';
import { planCurves } from '#shared/carving/plan-curve';
import { reliefs } from '#shared/measure/relief';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { reliefNames } from '../measure';
import { EntryAt, type EntryChoice } from '../ui/field/entry-at';
import { ExtentForm } from './extent-form';
import { fittingExtent } from './fitting-extent';
import type { CatalogueEntry } from './ornament-catalogue';
import { OrnamentPicker } from './ornament-picker';
import { planNames } from './plan-names';

/** Everything that is entered of one ornament of a member. */
@Component({
  selector: 'app-ornament-form',
  imports: [EntryAt, ExtentForm, OrnamentPicker],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './ornament-form.html',
  styleUrl: './ornament-form.scss',
})
export class OrnamentForm {
  private readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  /** Where the ornament stands in the document. */
  readonly path = input.required<string>();
  readonly catalogue = input.required<readonly CatalogueEntry[]>();
  /** Zones of the member it may stand in. */
  readonly zones = input<readonly EntryChoice[]>([]);
  /** Length of the member's own run, to begin with. */
  readonly memberRun_mm = input(0);

  protected readonly reliefs = reliefs.map((value) => ({ value, label: reliefNames[value] }));
  protected readonly plans = planCurves.map((value) => ({ value, label: planNames[value] }));
  protected readonly use = computed(() => this.form().value<OrnamentUse>(this.path()));
  private readonly entry = computed(() => this.catalogue().find(({ id }) => id === this.use()?.ornamentId));
  protected readonly way = computed(() => this.entry()?.way ?? 'piece');
  /** Work done once has hours of its own: relief, size and plan change nothing of it. */
  protected readonly isOnce = computed(() => this.entry()?.kind === 'once');
  protected readonly isOrnament = computed(() => !['once', 'shaping', 'free'].includes(this.entry()?.kind ?? 'piece'));
  protected readonly hasSize = computed(() => this.way() === 'piece' && this.entry()?.reference_mm !== null);
  protected readonly hasPlan = computed(() => this.isOrnament() || this.entry()?.kind === 'shaping');
  protected readonly zoneChoices = computed<readonly EntryChoice[]>(() => [
    { value: null, label: $localize`none` },
    ...this.zones(),
  ]);
  protected readonly sizeHint = computed(() => {
    const reference_mm = this.entry()?.reference_mm ?? null;
    return reference_mm === null ? '' : $localize`${this.formats.length(reference_mm)}:size: unless said`;
  });

  protected at(name: string): string {
    return `${this.path()}.${name}`;
  }

  protected take(entry: CatalogueEntry): void {
    const use = this.use();
    if (!use || use.ornamentId === entry.id) return;
    const extent = fittingExtent(use.extent, entry.way, this.memberRun_mm());
    const relief = entry.relief ?? use.relief;
    this.form().put(this.path(), { ...use, ornamentId: entry.id, extent, relief, size_mm: null });
  }
}
