import { computed, signal, type Signal } from '@angular/core';
import type { DrawnPart } from './laid-tasks';
import { pixelOf, scrolledAfterZoom, widthOf, withinZoom, type RibbonScale } from './ribbon-scale';

/** What is seen of the sheet, in pixels. */
interface Seen {
  readonly left: number;
  readonly top: number;
  readonly width: number;
  readonly height: number;
}

/** So much is drawn beyond what is seen, so that scrolling a little draws nothing anew: along the lines, and down them. */
const tile_px = { along: 384, down: 68 };
/** Lines are stretched so far while the size changes, and laid out anew beyond it or once it stays. */
const mostStretch = 1.7;

const tiled = (from: number, length: number, tile: number): readonly [number, number] => [
  (Math.floor(from / tile) - 1) * tile,
  (Math.ceil((from + length) / tile) + 1) * tile,
];

const isSamePart = (one: DrawnPart, other: DrawnPart): boolean =>
  one.left === other.left && one.right === other.right && one.top === other.top && one.bottom === other.bottom;

/**
 * What of a ribbon is in view and how large; where it has to be scrolled to after a zoom is asked of `scrollTo`. While the size changes from moment to
 * moment, what was laid out is stretched; it is laid out anew by `settle`.
 */
export class RibbonView {
  private readonly seenPart = signal<Seen>({ left: 0, top: 0, width: 900, height: 600 });
  private readonly hour = signal(9);
  private readonly laidHour = signal(9);

  readonly seen = this.seenPart.asReadonly();
  readonly hour_px = this.hour.asReadonly();
  /** By how much the lines are stretched along. */
  readonly stretch = computed(() => this.hour() / this.laidHour());
  readonly scale: Signal<RibbonScale>;
  /** The scale the lines are laid out in. */
  readonly laidScale: Signal<RibbonScale>;
  readonly width: Signal<number>;
  /** In steps of tiles: scrolling within one changes nothing. */
  readonly part = this.partAt(() => 1);
  /** The same in the pixels of the lines. */
  readonly laidPart = this.partAt(() => this.stretch());

  constructor(range: Signal<{ readonly first_minutes: number; readonly last_minutes: number }>) {
    const width_px = computed(() => this.seenPart().width);
    this.scale = computed(() => {
      const { first_minutes, last_minutes } = range();
      const filling = first_minutes + (width_px() * 60) / this.hour();
      return { first_minutes, last_minutes: Math.max(last_minutes, filling), hour_px: this.hour() };
    });
    const first = computed(() => range().first_minutes);
    this.laidScale = computed(() => ({ first_minutes: first(), last_minutes: Infinity, hour_px: this.laidHour() }));
    this.width = computed(() => widthOf(this.scale()));
  }

  look(seen: Partial<Seen>): void {
    this.seenPart.update((before) => ({ ...before, ...seen }));
  }

  /** Another size; the answer is where the left edge has to stand for the place at a pixel of the screen to stay there. */
  zoom(hour_px: number, at_px = this.seenPart().width / 2): number {
    const next = withinZoom(hour_px);
    const left = scrolledAfterZoom({ scroll_px: this.seenPart().left, at_px }, this.scale(), next);
    this.hour.set(next);
    const stretch = this.stretch();
    if (stretch > mostStretch || stretch < 1 / mostStretch) this.settle();
    return left;
  }

  /** Lays the lines out in the size there is now. */
  settle(): void {
    this.laidHour.set(this.hour());
  }

  /** Where the left edge has to stand for a moment to be seen in full, with what comes after it. */
  leftFor(minutes: number): number {
    return Math.max(0, pixelOf(minutes, this.scale()) - this.seenPart().width / 6);
  }

  private partAt(stretch: () => number): Signal<DrawnPart> {
    const part = () => {
      const { left, top, width, height } = this.seenPart();
      const [from, to] = tiled(left / stretch(), width / stretch(), tile_px.along);
      const [above, below] = tiled(top, height, tile_px.down);
      return { left: from, right: to, top: above, bottom: below };
    };
    return computed(part, { equal: isSamePart });
  }
}
