import { laidTasks, seenTasks, type DrawnLot, type DrawnPart, type DrawnTask } from './laid-tasks';
import type { RibbonLot } from './ribbon-lot';
import type { RibbonScale } from './ribbon-scale';

/** What is shown of a ribbon, and how large. */
export interface ShownPart {
  readonly scale: RibbonScale;
  readonly part: DrawnPart;
  readonly row_px: number;
}

interface KeptLine {
  readonly first_minutes: number;
  readonly hour_px: number;
  readonly all: readonly DrawnTask[];
  seen?: DrawnLot;
}

const isSameList = (one: readonly DrawnTask[], other: readonly DrawnTask[]): boolean =>
  one.length === other.length && one.every((task, at) => task === other[at]);

/**
 * The lines of a ribbon that lie in the part that is drawn, in pixels. A line is laid out once for each size, and the same line is handed out as long as
 * nothing on it comes or goes: so scrolling draws only what is new.
 */
export class RibbonLines {
  private readonly kept = new WeakMap<RibbonLot, KeptLine>();

  in(lots: readonly RibbonLot[], { scale, part, row_px }: ShownPart): DrawnLot[] {
    const first = Math.max(0, Math.floor(part.top / row_px));
    return lots.slice(first, Math.ceil(part.bottom / row_px)).map((lot, at) => {
      const line = this.line(lot, scale);
      const tasks = seenTasks(line.all, scale, part);
      const [index, before] = [first + at, line.seen];
      if (before?.index === index && before.y === index * row_px && isSameList(before.tasks, tasks)) return before;
      line.seen = { lot, index, y: index * row_px, tasks };
      return line.seen;
    });
  }

  private line(lot: RibbonLot, scale: RibbonScale): KeptLine {
    const { first_minutes, hour_px } = scale;
    const known = this.kept.get(lot);
    if (known?.hour_px === hour_px && known.first_minutes === first_minutes) return known;
    const laid = { first_minutes, hour_px, all: laidTasks(lot, scale) };
    this.kept.set(lot, laid);
    return laid;
  }
}
