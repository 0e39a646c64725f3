import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { LayPlanBand } from '#shared/leaf/lay-plan';
import { Formats } from '../core/formats/formats';
import { ScaleDrawing } from '../ui/drawing/scale-drawing';
import type { LaidAs } from './laying-names';
import { type CarvedRow, layPlanDrawn } from './lay-plan-drawn';

/** A zone laid with leaf, with what its plan is drawn from. */
export interface LaidZone extends LaidAs {
  readonly side_mm: number;
  readonly lap_mm: number;
  readonly bands: readonly LayPlanBand[];
}

/** The lay plan of one member to scale: every leaf, strip or cut where it lies, and the carved repeats beneath. */
@Component({
  selector: 'app-lay-plan',
  imports: [ScaleDrawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <figure>
      <figcaption>
        <span i18n>Lay plan, to scale</span>
        <span>{{ about() }}</span>
      </figcaption>
      <app-scale-drawing [view]="view()" [label]="label()" [most_px]="300" />
      @if (note()) {
        <p class="muted small">{{ note() }}</p>
      }
    </figure>
  `,
  styles: `
    figure {
      display: grid;
      gap: 8px;
      margin: 0;
      padding: 10px 16px 14px;
      border: 1px solid var(--line);
      border-radius: var(--radius-large);
      background: var(--paper);
    }

    figcaption {
      display: flex;
      flex-wrap: wrap;
      gap: 4px 24px;
      justify-content: space-between;
      color: var(--muted);
    }
  `,
})
export class LayPlanDrawing {
  private readonly formats = inject(Formats);

  readonly zones = input.required<readonly LaidZone[]>();
  readonly carved = input<readonly CarvedRow[]>([]);
  /** What is to be said beneath. */
  readonly note = input('');

  private readonly drawn = computed(() =>
    layPlanDrawn(
      this.zones().flatMap(({ bands }) => bands),
      this.carved(),
    ),
  );

  protected readonly about = computed(() => [this.leaves(), this.pieces(), this.laps()].filter(Boolean).join(', '));
  protected readonly label = computed(() => {
    const { pieces, isWhole } = this.drawn().plan;
    const count = this.formats.number(pieces.length, 0);
    const shown = isWhole ? $localize`${count}:count: pieces` : $localize`the first ${count}:count: pieces`;
    return $localize`Lay plan: ${shown}:pieces:, ${this.about()}:leaf:`;
  });
  protected readonly view = computed(() => {
    const { plan, view } = this.drawn();
    const along = view.dimensions.at(0);
    if (plan.shownLength_mm >= plan.length_mm - 1e-6 || !along) return view;
    const [shown, whole] = [plan.shownLength_mm, plan.length_mm].map((length_mm) =>
      this.formats.roughLength(length_mm),
    );
    return {
      ...view,
      dimensions: [
        { ...along, words: $localize`${shown}:shown: shown of ${whole}:length:` },
        ...view.dimensions.slice(1),
      ],
    };
  });

  private leaves(): string {
    return $localize`leaf ${this.listed(this.zones().map(({ side_mm }) => side_mm))}:side:`;
  }

  private pieces(): string {
    const strips = this.zones().flatMap(({ way, strips: count, side_mm }) =>
      way === 'lays' && count !== null && count > 1 ? [side_mm / count] : [],
    );
    const cuts = this.zones().flatMap(({ way, cuts: count, side_mm }) =>
      way === 'patches' && count !== null && count > 1 ? [side_mm / count] : [],
    );
    return [
      strips.length > 0 ? $localize`strips of ${this.listed(strips)}:widths:` : '',
      cuts.length > 0 ? $localize`cuts of ${this.listed(cuts)}:sides:` : '',
    ]
      .filter(Boolean)
      .join(', ');
  }

  private laps(): string {
    return $localize`laps ${this.listed(this.zones().map(({ lap_mm }) => lap_mm))}:laps:`;
  }

  /** Lengths one after another, each once. */
  private listed(lengths_mm: readonly number[]): string {
    const texts = [...new Set(lengths_mm.map((length_mm) => this.formats.length(length_mm)))];
    return new Intl.ListFormat(this.formats.locale(), { type: 'conjunction' }).format(texts);
  }
}
