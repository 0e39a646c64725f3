import { ChangeDetectionStrategy, Component, computed, input, signal } from '@angular/core';
import type { BuildUp, CoatSurface } from '#shared/buildups/buildup';
import { sectionStrip } from '#shared/buildups/section-strip';
import { stripLayers } from '../../buildups';
import { SectionStrip } from '../../ui/drawing/section-strip';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { coatSurfaces, shownZone } from './shown-zone';

/** The layers of a build-up as they are entered, on the surface one looks at. */
@Component({
  selector: 'app-build-up-strip',
  imports: [Entry, Field, SectionStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-field i18n-label label="Layers on a surface that is">
      <select appEntry class="dense" #chooser (change)="choose(chooser.selectedIndex)">
        @for (option of surfaces; track option.surface) {
          <option [selected]="option.surface === surface()">{{ option.name }}</option>
        }
      </select>
    </app-field>
    <app-section-strip [layers]="layers()" />
    <p class="muted small" i18n>Steps done only where they are asked for are drawn too.</p>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      align-content: start;
    }
  `,
})
export class BuildUpStrip {
  readonly buildUp = input.required<BuildUp>();

  protected readonly surfaces = coatSurfaces;
  protected readonly surface = signal<CoatSurface>('plain');
  protected readonly layers = computed(() => {
    const buildUp = this.buildUp();
    const layers = sectionStrip(buildUp, shownZone(buildUp, this.surface()), null);
    return stripLayers(layers, { timber: $localize`wood`, leaf: '' });
  });

  protected choose(index: number): void {
    this.surface.set(coatSurfaces[index]?.surface ?? 'plain');
  }
}
