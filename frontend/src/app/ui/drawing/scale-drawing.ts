import {
  ChangeDetectionStrategy,
  Component,
  DestroyRef,
  ElementRef,
  computed,
  inject,
  input,
  signal,
} from '@angular/core';
import { Formats } from '../../core/formats/formats';
import { drawingLayout } from './drawing-layout';
import type { ScaleView } from './scale-view';

/** One view drawn to scale with its dimensions; it takes the width it is given and lines stay as thin as they are. */
@Component({
  selector: 'app-scale-drawing',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './scale-drawing.html',
  styleUrl: './scale-drawing.scss',
})
export class ScaleDrawing {
  private readonly formats = inject(Formats);
  private readonly width_px = signal(600);

  readonly view = input.required<ScaleView>();
  /** What is drawn, in words. */
  readonly label = input.required<string>();
  readonly most_px = input(360);

  protected readonly layout = computed(() =>
    drawingLayout(this.view(), { width: this.width_px(), height: this.most_px() }),
  );
  protected readonly dimensions = computed(() =>
    this.layout().dimensions.map((dimension) => ({
      ...dimension,
      text: dimension.words ?? this.formats.length(dimension.label_mm),
    })),
  );
  /** The dimensions in words too: a drawing one cannot see still says how large the thing is. */
  protected readonly inWords = computed(() => [this.label(), ...this.dimensions().map(({ text }) => text)].join(', '));

  constructor() {
    const host = inject<ElementRef<HTMLElement>>(ElementRef).nativeElement;
    const observer = new ResizeObserver(() => this.width_px.set(host.clientWidth || 600));
    observer.observe(host);
    inject(DestroyRef).onDestroy(() => observer.disconnect());
  }
}
