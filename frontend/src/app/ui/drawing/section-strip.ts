import { ChangeDetectionStrategy, Component, computed, input } from '@angular/core';
import type { StripLayer } from './strip-layer';

const thin_px = 22;

/** A build-up as the cross-section of its layers, the finish on top and the wood at the bottom. */
@Component({
  selector: 'app-section-strip',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './section-strip.html',
  styleUrl: './section-strip.scss',
})
export class SectionStrip {
  readonly layers = input.required<readonly StripLayer[]>();

  protected readonly drawn = computed(() => {
    let top = 0;
    return this.layers().map((layer) => {
      const height = Math.round(thin_px * Math.min(2, Math.max(1, layer.weight ?? 1)));
      const place = { ...layer, top, height, middle: top + height / 2 + 5 };
      top += height;
      return place;
    });
  });
  protected readonly height = computed(() => this.drawn().reduce((sum, { height }) => sum + height, 0));
  /** The same in words, for whoever does not see the picture. */
  protected readonly inWords = computed(() =>
    this.layers()
      .map(({ label, count }) => (count ? `${label} (${count})` : label))
      .join('; '),
  );
}
