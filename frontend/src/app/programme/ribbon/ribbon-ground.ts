import { computed, type Signal } from '@angular/core';
import type { ProgrammeFrame } from '#shared/programme/programme-frame';
import type { MomentSpan } from '#shared/programme/shop-calendar';
import { ribbonBar } from './ribbon-bar';
import { closedStretches, ribbonMarks, type RibbonMark } from './ribbon-marks';
import { pixelOf } from './ribbon-scale';
import type { RibbonView } from './ribbon-view';

/** What the ground of a ribbon is drawn from. */
interface GroundParts {
  readonly view: RibbonView;
  readonly frame: Signal<ProgrammeFrame>;
  readonly open: Signal<readonly MomentSpan[]>;
  readonly now_minutes: Signal<number | undefined>;
  readonly height: Signal<number>;
  readonly row_px: number;
}

/** What lies behind the lines of a ribbon, each kind one drawing: nights and closed days, lines of hours and days, and now. */
export class RibbonGround {
  private readonly marks = computed(() =>
    ribbonMarks(this.parts.view.part(), this.parts.view.scale(), this.parts.frame()),
  );
  /** The marks that are named at the head. */
  readonly days = computed(() =>
    this.marks().filter(({ kind, x }) => kind !== 'hour' && x < this.parts.view.width() - 40),
  );
  readonly closed = computed(() => {
    const { view, open, height } = this.parts;
    const shape = { y: 0, height: height(), radius: 0 };
    const stretches = closedStretches(open(), { part: view.part(), scale: view.scale() });
    return stretches.map((one) => ribbonBar(one, shape)).join('');
  });
  readonly hourLines = computed(() => this.linesAt(({ kind }) => kind === 'hour'));
  readonly dayLines = computed(() => this.linesAt(({ kind }) => kind !== 'hour'));
  readonly rowLines = computed(() => {
    const { view, height, row_px } = this.parts;
    const [width, { top, bottom }] = [view.width(), view.part()];
    const first = Math.max(0, Math.floor(top / row_px));
    const count = Math.max(0, Math.ceil(Math.min(bottom, height()) / row_px) - first + 1);
    return Array.from({ length: count }, (_, at) => `M0 ${(first + at) * row_px}H${width}`).join('');
  });
  readonly nowX = computed(() => {
    const { view, now_minutes } = this.parts;
    const now = now_minutes();
    if (now === undefined) return null;
    const x = pixelOf(now, view.scale());
    return x >= 0 && x <= view.width() ? x : null;
  });

  constructor(private readonly parts: GroundParts) {}

  private linesAt(isSo: (mark: RibbonMark) => boolean): string {
    const height = this.parts.height();
    return this.marks()
      .filter(isSo)
      .map(({ x }) => `M${x} 0V${height}`)
      .join('');
  }
}
