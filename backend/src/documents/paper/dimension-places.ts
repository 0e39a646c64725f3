import type { DrawingDimension, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';

type Side = DrawingDimension['side'];

export const sides: readonly Side[] = ['above', 'below', 'left', 'right'];

/** A dimension with its label, and how far out its line stands: 0 nearest to the figure. */
export interface PlacedDimension {
  readonly dimension: DrawingDimension;
  readonly label: string;
  readonly label_pt: number;
  readonly tier: number;
}

/** Points a millimetre of the thing takes, the height of a label, and how a length is written and how wide that is. */
export interface DimensionSetting {
  readonly scale: number;
  readonly labelHeight_pt: number;
  readonly label: (length_mm: number) => string;
  readonly widthOf: (label: string) => number;
}

interface Interval {
  readonly from: number;
  readonly to: number;
}

export const isUpright = (side: Side): boolean => side === 'left' || side === 'right';

const along = (side: Side, point: DrawingPoint): number => (isUpright(side) ? point.y_mm : point.x_mm);

/** What a dimension takes along its side: its own length, or its label where that is longer. */
function intervalOf({ side, from, to }: DrawingDimension, label_pt: number, setting: DimensionSetting): Interval {
  const [one, other] = [along(side, from) * setting.scale, along(side, to) * setting.scale];
  const half = Math.max(Math.abs(other - one), isUpright(side) ? setting.labelHeight_pt : label_pt + 6) / 2;
  const middle = (one + other) / 2;
  return { from: middle - half + 0.5, to: middle + half - 0.5 };
}

const isClear = (one: Interval, taken: readonly Interval[]): boolean =>
  taken.every((other) => one.to <= other.from || one.from >= other.to);

function onSide(side: Side, view: DrawingView, setting: DimensionSetting): PlacedDimension[] {
  const tiers: Interval[][] = [];
  return view.dimensions
    .filter((dimension) => dimension.side === side)
    .map((dimension) => {
      const label = setting.label(dimension.label_mm);
      const label_pt = setting.widthOf(label);
      const interval = intervalOf(dimension, label_pt, setting);
      const free = tiers.findIndex((taken) => isClear(interval, taken));
      const tier = free === -1 ? tiers.length : free;
      tiers[tier] = [...(tiers[tier] ?? []), interval];
      return { dimension, label, label_pt, tier };
    });
}

/** Puts the dimensions of a view in rows clear of one another, side by side in one row where they can. */
export const dimensionPlaces = (view: DrawingView, setting: DimensionSetting): PlacedDimension[] =>
  sides.flatMap((side) => onSide(side, view, setting));
