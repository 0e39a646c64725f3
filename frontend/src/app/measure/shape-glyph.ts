import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { Shape } from '#shared/measure/shape';

const margin = 0.04;

/** A member so small that only its shape is seen: the first view of its drawing without dimensions, to its own scale. */
@Component({
  selector: 'app-shape-glyph',
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <svg aria-hidden="true" focusable="false" [attr.viewBox]="box()">
      @for (path of paths(); track $index) {
        <path [attr.d]="path.data" />
      }
    </svg>
  `,
  styles: `
    :host {
      display: inline-flex;
      flex: none;
      width: 40px;
      height: 32px;
    }

    svg {
      width: 100%;
      height: 100%;
    }

    path {
      fill: none;
      stroke: var(--ink);
      stroke-linejoin: round;
      stroke-width: 1.2;
      vector-effect: non-scaling-stroke;
    }
  `,
})
export class ShapeGlyph {
  readonly shape = input.required<Shape>();

  private readonly view = computed(() => memberDrawing(this.shape()).views.at(0));
  /** A measured area has no drawing of its own: any patch stands for it. */
  protected readonly paths = computed(
    () =>
      this.view()?.paths.filter(({ kind }) => kind === 'outline') ?? [
        { data: 'M 20 60 C 10 30 40 10 70 20 S 150 10 165 40 S 150 95 110 90 S 30 95 20 60 Z' },
      ],
  );
  protected readonly box = computed(() => {
    const { left_mm, top_mm, width_mm, height_mm } = this.view()?.box ?? patch;
    const edge = margin * Math.max(width_mm, height_mm, 1);
    return [left_mm - edge, top_mm - edge, width_mm + 2 * edge, height_mm + 2 * edge].join(' ');
  });
}

const patch = { left_mm: 10, top_mm: 10, width_mm: 160, height_mm: 90 };
