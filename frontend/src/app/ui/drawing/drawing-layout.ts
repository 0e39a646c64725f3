import type { ScaleDimension, ScalePoint, ScaleView } from './scale-view';

const tier_px = 26;
const edge_px = 12;
const overshoot_px = 4;

type Side = ScaleDimension['side'];

/** Where a dimension stands on the screen, in px: its two witness lines, its own line, and the middle of its figure. */
export interface PlacedDimension {
  readonly label_mm: number;
  readonly words?: string;
  readonly isUpright: boolean;
  readonly lines: string;
  readonly x: number;
  readonly y: number;
}

/** A view fitted into a width: how many px one mm takes, the size of the whole, and every dimension in its place. */
export interface DrawingLayout {
  readonly scale: number;
  readonly width: number;
  readonly height: number;
  readonly moved: string;
  readonly dimensions: readonly PlacedDimension[];
}

/** The space one has for a drawing, in px. */
export interface Space {
  readonly width: number;
  readonly height: number;
}

const countOn = (view: ScaleView, side: Side): number =>
  view.dimensions.filter((dimension) => dimension.side === side).length;

function margins(view: ScaleView) {
  const on = (side: Side) => edge_px + countOn(view, side) * tier_px;
  return { above: on('above'), below: on('below'), left: on('left'), right: on('right') };
}

/** Fits a view with its dimensions into a space, to one scale both ways; dimensions of one side stand in rows, the first one nearest. */
export function drawingLayout(view: ScaleView, space: Space): DrawingLayout {
  const around = margins(view);
  const { left_mm, top_mm, width_mm, height_mm } = view.box;
  const fitting = [
    (space.width - around.left - around.right) / Math.max(width_mm, 1),
    (space.height - around.above - around.below) / Math.max(height_mm, 1),
  ];
  const scale = Math.max(0.001, Math.min(...fitting));
  const place = ({ x_mm, y_mm }: ScalePoint) => ({
    x: around.left + (x_mm - left_mm) * scale,
    y: around.above + (y_mm - top_mm) * scale,
  });
  const far = { x: around.left + width_mm * scale, y: around.above + height_mm * scale };
  return {
    scale,
    width: far.x + around.right,
    height: far.y + around.below,
    moved: `translate(${around.left - left_mm * scale} ${around.above - top_mm * scale}) scale(${scale})`,
    dimensions: view.dimensions.map((dimension) => {
      const tier = view.dimensions.filter(({ side }) => side === dimension.side).indexOf(dimension) + 1;
      const at = {
        above: around.above - tier * tier_px,
        below: far.y + tier * tier_px,
        left: around.left - tier * tier_px,
        right: far.x + tier * tier_px,
      };
      return placed(dimension, { from: place(dimension.from), to: place(dimension.to), at: at[dimension.side] });
    }),
  };
}

interface Ends {
  readonly from: { readonly x: number; readonly y: number };
  readonly to: { readonly x: number; readonly y: number };
  readonly at: number;
}

function placed({ label_mm, words, side }: ScaleDimension, { from, to, at }: Ends): PlacedDimension {
  if (side === 'above' || side === 'below') {
    const beyond = side === 'above' ? at - overshoot_px : at + overshoot_px;
    const lines = `M${from.x} ${from.y}V${beyond}M${to.x} ${to.y}V${beyond}M${from.x} ${at}H${to.x}`;
    return { label_mm, words, isUpright: false, lines, x: (from.x + to.x) / 2, y: at };
  }
  const beyond = side === 'left' ? at - overshoot_px : at + overshoot_px;
  const lines = `M${from.x} ${from.y}H${beyond}M${to.x} ${to.y}H${beyond}M${at} ${from.y}V${to.y}`;
  return { label_mm, words, isUpright: true, lines, x: at, y: (from.y + to.y) / 2 };
}
