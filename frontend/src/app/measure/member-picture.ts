import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { DrawingView } from '#shared/measure/drawing/drawing';
import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { Opening } from '#shared/measure/opening';
import type { Shape } from '#shared/measure/shape';
import { ScaleDrawing } from '../ui/drawing/scale-drawing';

const viewNames: Readonly<Record<DrawingView['view'], string>> = {
  face: $localize`Face`,
  profile: $localize`Section`,
  plan: $localize`Plan`,
  elevation: $localize`Elevation`,
  unrolled: $localize`Unrolled`,
};

/** A member drawn to scale from the numbers its surface is worked from, view by view, each with its dimensions. */
@Component({
  selector: 'app-member-picture',
  imports: [ScaleDrawing],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @for (view of views(); track $index) {
      <figure [class.slim]="view.isSlim">
        <figcaption class="muted">{{ view.name }}</figcaption>
        <app-scale-drawing [view]="view.drawn" [label]="name() + ', ' + view.name" [most_px]="view.most_px" />
      </figure>
    } @empty {
      <p class="muted" i18n>A measured area is given as a figure; there is nothing to draw.</p>
    }
    @if (hasOpenings()) {
      <p class="muted" i18n>Openings are dashed: take their place from the piece.</p>
    }
  `,
  styles: `
    :host {
      display: flex;
      flex-wrap: wrap;
      gap: 16px 32px;
    }

    figure {
      flex: 1 1 240px;
      min-width: 0;
      margin: 0;
    }

    figure ~ p {
      flex-basis: 100%;
      margin: 0;
    }

    .slim {
      flex: 0 1 150px;
    }

    .slim:only-child {
      flex-grow: 1;
    }

    figcaption {
      font-size: 0.9375rem;
    }
  `,
})
export class MemberPicture {
  readonly shape = input.required<Shape>();
  readonly openings = input<readonly Opening[]>([]);
  readonly name = input.required<string>();
  readonly most_px = input(300);

  protected readonly views = computed(() =>
    memberDrawing(this.shape(), this.openings()).views.map((drawn, index, all) => {
      const isSlim = drawn.box.height_mm > 1.5 * drawn.box.width_mm;
      const isSide = all.slice(0, index).some(({ view }) => view === drawn.view);
      // What is tall and slim may be taller: it stands beside its plan.
      return { drawn, isSlim, name: this.nameOf(drawn.view, isSide), most_px: this.most_px() * (isSlim ? 1.5 : 1) };
    }),
  );

  protected readonly hasOpenings = computed(() =>
    this.views().some(({ drawn }) => drawn.paths.some(({ kind }) => kind === 'opening')),
  );

  private nameOf(view: DrawingView['view'], isSide: boolean): string {
    const { kind } = this.shape();
    if (kind === 'cabriole' || kind === 'stations') return $localize`Straightened, each girth as a round`;
    return isSide ? $localize`Side` : viewNames[view];
  }
}
