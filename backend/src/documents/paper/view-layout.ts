import type { DrawingDimension, DrawingView } from '#shared/measure/drawing/drawing';
import { dimensionPlaces, type DimensionSetting, type PlacedDimension } from './dimension-places';

const pointsPerMillimetre = 72 / 25.4;

/** Scales of drawings as ISO 5455 recommends them, thing : paper, the largest first. */
const scales: readonly (readonly [number, number])[] = [
  [10, 1],
  [5, 1],
  [2, 1],
  [1, 1],
  [1, 2],
  [1, 5],
  [1, 10],
  [1, 20],
  [1, 50],
  [1, 100],
  [1, 200],
  [1, 500],
];

const edge_pt = 3;
const firstTier_pt = 9;
const tier_pt = 10;
const line_pt = 8;

/** A view at the scale it is drawn to, with the room its dimensions take on each side, in points. */
export interface ViewLayout {
  readonly scale: number;
  readonly ratio: readonly [number, number];
  readonly margins: Readonly<Record<DrawingDimension['side'], number>>;
  readonly dimensions: readonly PlacedDimension[];
  readonly width_pt: number;
  readonly height_pt: number;
}

const outermost = (dimensions: readonly PlacedDimension[]): number => Math.max(...dimensions.map(({ tier }) => tier));

/** How far out the line of a tier stands: labels beside it are as wide as they are, above or below it one line high. */
export const tierOffset = (tier: number, labelWidth_pt: number): number =>
  firstTier_pt + tier * (labelWidth_pt > 0 ? labelWidth_pt + 8 : tier_pt + line_pt);

/** The widest label of one side where labels stand beside their lines. */
export const besideWidth = (dimensions: readonly PlacedDimension[], side: 'left' | 'right'): number =>
  Math.max(0, ...dimensions.filter((one) => one.dimension.side === side).map((one) => one.label_pt));

function marginOf(dimensions: readonly PlacedDimension[], side: DrawingDimension['side']): number {
  const own = dimensions.filter((one) => one.dimension.side === side);
  if (own.length === 0) return edge_pt;
  const beside = side === 'left' || side === 'right' ? besideWidth(dimensions, side) : 0;
  return tierOffset(outermost(own), beside) + (beside > 0 ? beside + 6 : line_pt + 3);
}

function layoutAt(
  view: DrawingView,
  { scale, ratio }: Pick<ViewLayout, 'scale' | 'ratio'>,
  setting: Omit<DimensionSetting, 'scale'>,
): ViewLayout {
  const dimensions = dimensionPlaces(view, { ...setting, scale });
  const [above, below, left, right] = (['above', 'below', 'left', 'right'] as const).map((side) =>
    marginOf(dimensions, side),
  );
  return {
    ...{ scale, ratio, dimensions, margins: { above, below, left, right } },
    width_pt: left + view.box.width_mm * scale + right,
    height_pt: above + view.box.height_mm * scale + below,
  };
}

/** The largest recommended scale, in points a millimetre, at which something fits; the smallest where it fits at none. */
export function fittingScale(fits: (scale: number) => boolean): Pick<ViewLayout, 'scale' | 'ratio'> {
  const all = scales.map((ratio) => ({ ratio, scale: (pointsPerMillimetre * ratio[0]) / ratio[1] }));
  return all.find(({ scale }) => fits(scale)) ?? all[all.length - 1];
}

/** The largest recommended scale at which a view with its dimensions fits a box in points; the smallest where none does. */
export function viewLayout(
  view: DrawingView,
  box: { readonly width_pt: number; readonly height_pt: number },
  setting: Omit<DimensionSetting, 'scale'>,
): ViewLayout {
  const isWithin = (layout: ViewLayout) => layout.width_pt <= box.width_pt && layout.height_pt <= box.height_pt;
  const fitting = fittingScale((scale) => isWithin(layoutAt(view, { scale, ratio: [1, 1] }, setting)));
  return layoutAt(view, fitting, setting);
}
