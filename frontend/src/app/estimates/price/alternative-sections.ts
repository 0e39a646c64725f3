import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { alternativeZones } from '#shared/estimates/alternative-zones';
import { buildUpsUsed } from '#shared/estimates/buildups-used';
import type { Figures, ZoneFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';
import { stripLayers } from '../../buildups';
import { SectionStrip } from '../../ui/drawing/section-strip';
import { AlternativeTotals } from './alternative-totals';

/** What a zone’s wood is called, by its member. */
const timberOf = ({ members }: Figures, zones: readonly ZoneFigures[], ids: readonly string[]) => {
  const memberIds = new Set(zones.filter(({ zoneId }) => ids.includes(zoneId)).map(({ memberId }) => memberId));
  const timbers = members.filter(({ memberId }) => memberIds.has(memberId)).map(({ timber }) => timber);
  return [...new Set(timbers)].join(', ');
};

const stripsOf = (figures: Figures, zones: readonly ZoneFigures[]) =>
  buildUpsUsed(zones).map(({ buildUp, layers, leaf, zoneIds }) => ({
    name: buildUp,
    layers: stripLayers(
      layers.map((layer) => ({ ...layer, coats: layer.coats[1] })),
      { timber: timberOf(figures, zones, zoneIds), leaf: leaf.join(', ') },
    ),
  }));

/** The build-ups an alternative changes, drawn as the sections through their layers: those of the base beside its own. */
@Component({
  selector: 'app-alternative-sections',
  imports: [SectionStrip],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (sides(); as sides) {
      @for (side of sides; track side.key) {
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
  private readonly totals = inject(AlternativeTotals);

  readonly alternative = input.required<Alternative>();

  /** Undefined until it is worked, and where it changes nothing that is coated. */
  protected readonly sides = computed(() => {
    const [worked, alternative] = [this.totals.worked(), this.alternative()];
    const own = worked?.own.get(alternative.id);
    if (!worked || !own) return undefined;
    const { before, after } = alternativeZones(worked.asked.draft, alternative, { base: worked.base, own });
    const sides = [
      { key: 'base', heading: $localize`In the base`, strips: stripsOf(worked.base, before) },
      { key: 'own', heading: $localize`With “${alternative.name}:name:”`, strips: stripsOf(own, after) },
    ];
    return sides.some(({ strips }) => strips.length > 0) ? sides : undefined;
  });
}
