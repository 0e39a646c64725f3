import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { AlternativeSections as Sections } from '#shared/estimates/alternative-sections';
import { stripLayers } from '../../buildups';
import { SectionStrip } from '../../ui/drawing/section-strip';

const stripsOf = (sections: Sections['before']) =>
  sections.map(({ buildUp, layers, leaf, timber }) => ({
    name: buildUp,
    layers: stripLayers(
      layers.map((layer) => ({ ...layer, coats: layer.coats[1] })),
      { timber, leaf: leaf.join(', ') },
    ),
  }));

/** The build-ups an alternative changes, drawn as the sections through their layers: those of the base beside its own. */
@Component({
  selector: 'app-alternative-sections',
  imports: [SectionStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (side of sides(); track side.key) {
      <section>
        <h4>{{ side.heading }}</h4>
        @for (strip of side.strips; track $index) {
          <p>{{ strip.name }}</p>
          <app-section-strip [layers]="strip.layers" />
        } @empty {
          <p class="muted" i18n>No coats.</p>
        }
      </section>
    }
  `,
  styles: `
    :host {
      display: grid;
      grid-template-columns: repeat(auto-fit, minmax(min(100%, 260px), 1fr));
      gap: 16px 24px;

      &:empty {
        display: none;
      }
    }

    section {
      display: grid;
      gap: 8px;
      align-content: start;
      min-width: 0;
    }

    p {
      margin: 0;
    }
  `,
})
export class AlternativeSections {
  readonly name = input.required<string>();
  /** Undefined until it is worked. */
  readonly sections = input.required<Sections | undefined>();

  /** None where it changes nothing that is coated. */
  protected readonly sides = computed(() => {
    const { before = [], after = [] } = this.sections() ?? {};
    if (before.length + after.length === 0) return [];
    return [
      { key: 'base', heading: $localize`In the base`, strips: stripsOf(before) },
      { key: 'own', heading: $localize`With “${this.name()}:name:”`, strips: stripsOf(after) },
    ];
  });
}
