import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { isUpright, type PlacedDimension } from './dimension-places';
import type { Figure } from './figure';
import type { Pdf } from './open-paper';
import { paperColours, textStyles } from './paper-colours';
import { textWidth, writeLine } from './text-lines';
import { besideWidth, tierOffset, viewLayout, type ViewLayout } from './view-layout';

const strokes: Readonly<Record<DrawingPath['kind'], { weight_pt: number; colour: string; dash: readonly number[] }>> = {
  outline: { weight_pt: 0.9, colour: paperColours.ink, dash: [] },
  cut: { weight_pt: 0.35, colour: paperColours.muted, dash: [] },
  hidden: { weight_pt: 0.5, colour: paperColours.muted, dash: [3, 2] },
  opening: { weight_pt: 0.6, colour: paperColours.ink, dash: [3, 2] },
  axis: { weight_pt: 0.4, colour: paperColours.muted, dash: [8, 2, 1.5, 2] },
};

/** Where a view lies on the page: its origin in points, and how it is laid out. */
interface Laid {
  readonly pdf: Pdf;
  readonly view: DrawingView;
  readonly layout: ViewLayout;
  readonly origin: { readonly x: number; readonly y: number };
}

function drawPaths({ pdf, view, layout: { scale }, origin }: Laid): void {
  for (const { kind, data } of view.paths.filter((path) => path.data !== '')) {
    const { weight_pt, colour, dash } = strokes[kind];
    pdf.save().translate(origin.x, origin.y).scale(scale);
    pdf
      .lineWidth(weight_pt / scale)
      .lineJoin('round')
      .lineCap('round')
      .strokeColor(colour);
    if (dash.length > 0) pdf.dash(dash.map((part) => part / scale) as unknown as number, {});
    pdf.path(data).stroke();
    pdf.restore();
  }
}

const onPage = ({ origin, layout }: Laid, { x_mm, y_mm }: DrawingPoint) => ({
  x: origin.x + x_mm * layout.scale,
  y: origin.y + y_mm * layout.scale,
});

/** How far from the figure the line of a dimension stands, as a place across it. */
function lineAt({ view: { box }, layout, origin }: Laid, { dimension: { side }, tier }: PlacedDimension): number {
  const [left, top] = [origin.x + box.left_mm * layout.scale, origin.y + box.top_mm * layout.scale];
  switch (side) {
    case 'above':
      return top - tierOffset(tier, 0);
    case 'below':
      return top + box.height_mm * layout.scale + tierOffset(tier, 0);
    case 'left':
      return left - tierOffset(tier, besideWidth(layout.dimensions, 'left'));
    case 'right':
      return left + box.width_mm * layout.scale + tierOffset(tier, besideWidth(layout.dimensions, 'right'));
  }
}

const witness_pt = 3;

function drawLines(laid: Laid, placed: PlacedDimension): void {
  const { pdf } = laid;
  const { side } = placed.dimension;
  const at = lineAt(laid, placed);
  const outwards = side === 'above' || side === 'left' ? -1 : 1;
  const ends = [onPage(laid, placed.dimension.from), onPage(laid, placed.dimension.to)];
  pdf.lineWidth(0.4).strokeColor(paperColours.muted).undash();
  for (const end of ends) {
    const [x, y] = isUpright(side) ? [at, end.y] : [end.x, at];
    const begin = isUpright(side) ? [end.x + outwards * witness_pt, end.y] : [end.x, end.y + outwards * witness_pt];
    const past = isUpright(side) ? [at + outwards * 2.5, end.y] : [end.x, at + outwards * 2.5];
    pdf.moveTo(begin[0], begin[1]).lineTo(past[0], past[1]).stroke();
    pdf
      .moveTo(x - 2, y + 2)
      .lineTo(x + 2, y - 2)
      .stroke();
  }
  if (isUpright(side)) pdf.moveTo(at, ends[0].y).lineTo(at, ends[1].y).stroke();
  else pdf.moveTo(ends[0].x, at).lineTo(ends[1].x, at).stroke();
}

function writeLabel(laid: Laid, placed: PlacedDimension): void {
  const style = textStyles.dimension;
  const { side, from, to } = placed.dimension;
  const at = lineAt(laid, placed);
  const [one, other] = [onPage(laid, from), onPage(laid, to)];
  const middle = { x: (one.x + other.x) / 2, y: (one.y + other.y) / 2 };
  const places = {
    above: { x_pt: middle.x, y_pt: at - style.leading_pt - 0.5, align: 'centre' },
    below: { x_pt: middle.x, y_pt: at + 1, align: 'centre' },
    left: { x_pt: at - 3.5, y_pt: middle.y - style.leading_pt / 2, align: 'right' },
    right: { x_pt: at + 3.5, y_pt: middle.y - style.leading_pt / 2, align: 'left' },
  } as const;
  writeLine(laid.pdf, placed.label, { style, place: places[side] });
}

/** A view at a recommended scale within a box, dimensioned, with the scale it came to. */
export interface ScaledView {
  readonly figure: Figure;
  /** As it is written: 1 : 5. */
  readonly scale: string;
}

/** What a view is drawn with: the box it has, what it shows in words, how lengths are written. */
export interface ViewSetting {
  readonly box: { readonly width_pt: number; readonly height_pt: number };
  readonly name: string;
  readonly length: (length_mm: number) => string;
}

/** Draws a view to scale with its dimensions; lines keep their weight at every scale. */
export function viewFigure(pdf: Pdf, view: DrawingView, setting: ViewSetting): ScaledView {
  const style = textStyles.dimension;
  const layout = viewLayout(view, setting.box, {
    labelHeight_pt: style.leading_pt,
    label: setting.length,
    widthOf: (label) => textWidth(pdf, label, style),
  });
  const draw = (x_pt: number, y_pt: number) => {
    const { margins, scale, dimensions } = layout;
    const origin = {
      x: x_pt + margins.left - view.box.left_mm * scale,
      y: y_pt + margins.above - view.box.top_mm * scale,
    };
    const laid = { pdf, view, layout, origin };
    drawPaths(laid);
    for (const placed of dimensions) {
      drawLines(laid, placed);
      writeLabel(laid, placed);
    }
  };
  const scale = `${layout.ratio[0]} : ${layout.ratio[1]}`;
  const alt = [setting.name, scale, ...layout.dimensions.map(({ label }) => label)].join(', ');
  return { figure: { width_pt: layout.width_pt, height_pt: layout.height_pt, alt, draw }, scale };
}
