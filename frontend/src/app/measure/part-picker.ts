import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { strokesData } from '#shared/measure/drawing/stroke-data';
import { profileView } from '#shared/measure/drawing/profile-view';
import { profileCurve } from '#shared/measure/profile-curve';
import type { ProfileElement } from '#shared/measure/profile-element';
import type { SurfacePart } from '#shared/measure/surface';
import { Formats } from '../core/formats/formats';
import { elementName } from './element-names';

/** Parts of a girth to choose from: on the profile with the pointer, or by ticks that say the same. */
@Component({
  selector: 'app-part-picker',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './part-picker.html',
  styleUrl: './part-picker.scss',
})
export class PartPicker {
  private readonly formats = inject(Formats);

  readonly profile = input.required<readonly ProfileElement[]>();
  readonly parts = input.required<readonly SurfacePart[]>();
  readonly chosen = input.required<readonly string[]>();
  /** Parts other zones take already. */
  readonly taken = input<readonly string[]>([]);
  readonly isDisabled = input(false);
  readonly changed = output<readonly string[]>();

  protected readonly lines = computed(() =>
    this.parts()
      .map(({ key, element, girth_mm }, index) => ({
        key,
        label: `${index + 1} ${elementName(element)}`,
        girth: this.formats.length(girth_mm),
        isChosen: this.chosen().includes(key),
        isTaken: this.taken().includes(key),
      }))
      .reverse(),
  );
  protected readonly curves = computed(() =>
    profileCurve(this.profile()).map(({ id, strokes }) => ({ key: id, data: strokesData(strokes) })),
  );
  protected readonly box = computed(() => {
    const { left_mm, top_mm, width_mm, height_mm } = profileView(this.profile()).box;
    const edge = 0.08 * Math.max(width_mm, height_mm, 1);
    return [left_mm - edge, top_mm - edge, width_mm + 2 * edge, height_mm + 2 * edge].join(' ');
  });

  protected isChosen(key: string): boolean {
    return this.chosen().includes(key);
  }

  protected turn(key: string): void {
    if (this.isDisabled()) return;
    const next = this.isChosen(key) ? this.chosen().filter((one) => one !== key) : [...this.chosen(), key];
    // In the order of the profile, however they were picked; what the profile no longer has falls away.
    this.changed.emit(this.parts().flatMap((part) => (next.includes(part.key) ? [part.key] : [])));
  }
}
