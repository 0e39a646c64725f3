import { computed } from '@angular/core';
import type { Formats } from '../../core/formats/formats';
import { RibbonDayNames } from './ribbon-day-names';
import type { RibbonGround } from './ribbon-ground';
import type { RibbonView } from './ribbon-view';

/** A letter of a name, and a little more. */
const letter_px = 10;

/** The names at the head of a ribbon. */
export class RibbonHead {
  private readonly names: RibbonDayNames;
  readonly days = computed(() => this.ground.days().map((mark) => ({ x: mark.x, text: this.names.of(mark) })));
  /** How many stand before the first that is seen whole: they would be cut at the left. */
  readonly firstWhole = computed(() => {
    const { left } = this.view.seen();
    return this.days().filter(({ x }) => x < left).length;
  });
  /** The name of what the left edge stands in, where there is room for it before the next. */
  readonly edgeName = computed(() => {
    const first = this.firstWhole();
    if (first === 0) return '';
    const [before, next] = [this.days()[first - 1], this.days().at(first)];
    const room_px = (next?.x ?? Infinity) - this.view.seen().left;
    return room_px > before.text.length * letter_px ? before.text : '';
  });

  constructor(
    private readonly ground: RibbonGround,
    private readonly view: RibbonView,
    formats: Formats,
  ) {
    this.names = new RibbonDayNames(formats);
  }
}
