import type { LayerColour } from '#shared/buildups/buildup';
import type { LeafMetal } from '#shared/leaf/leaf-product';
import type { Figure } from './figure';
import type { Pdf } from './open-paper';
import { paperColours, textStyles } from './paper-colours';
import { fittedLine, writeLine } from './text-lines';

/** One layer as it is drawn: its name, its coats in words, what it is made of, how thick it is against a coat of gesso. */
export interface DrawnLayer {
  readonly name: string;
  readonly coats: string;
  readonly colour: LayerColour | LeafMetal;
  readonly thickness: number;
}

/** The colours of the materials, the same as on the screen. */
const fills: Readonly<Record<DrawnLayer['colour'], string>> = {
  none: '#ffffff',
  wood: '#c9a877',
  size: '#e6d9bd',
  gesso: '#f7efe3',
  'yellow-bole': '#c8922e',
  'red-bole': '#8a2e22',
  leaf: '#d9a93a',
  gold: '#d9a93a',
  silver: '#cfd1d2',
  palladium: '#cfd1d2',
  aluminium: '#dfe1e2',
  composition: '#cfa14f',
  'oil-size': '#dfc48b',
  shellac: '#ecdfc3',
  'coloured-ground': '#b9b3a4',
  tone: '#b08c5e',
  white: '#fcfaf5',
  glaze: '#c99a5d',
  varnish: '#f3e6c4',
  paint: '#b9b3a4',
};

const isDark = (colour: DrawnLayer['colour']): boolean => colour === 'red-bole';

/** Thick enough to write in; a ground twice that. True thickness would hide the leaf. */
const layerHeight = ({ thickness }: DrawnLayer): number => 15 * Math.min(1.8, Math.max(1, thickness / 3));

interface Band {
  readonly x_pt: number;
  readonly y_pt: number;
  readonly width_pt: number;
  readonly height_pt: number;
}

function drawGrain(pdf: Pdf, { x_pt, y_pt, width_pt, height_pt }: Band): void {
  pdf.save().rect(x_pt, y_pt, width_pt, height_pt).clip().lineWidth(0.5).strokeColor('#b3905f');
  for (let rise = -4; rise < height_pt + 8; rise += 5) {
    const y = y_pt + rise;
    pdf
      .moveTo(x_pt, y)
      .bezierCurveTo(x_pt + width_pt * 0.3, y - 5, x_pt + width_pt * 0.6, y + 5, x_pt + width_pt, y - 1)
      .stroke();
  }
  pdf.restore();
}

function drawLayer(pdf: Pdf, layer: DrawnLayer, band: Band): void {
  const style = { ...textStyles.note, colour: isDark(layer.colour) ? '#fffdf9' : paperColours.ink };
  const { x_pt, y_pt, width_pt, height_pt } = band;
  pdf.rect(x_pt, y_pt, width_pt, height_pt).fill(fills[layer.colour]);
  if (layer.colour === 'wood') drawGrain(pdf, band);
  const line_pt = y_pt + (height_pt - style.leading_pt) / 2;
  const name = fittedLine(pdf, layer.name, { style, width_pt: width_pt - 50 });
  writeLine(pdf, name, { style, place: { x_pt: x_pt + 6, y_pt: line_pt } });
  writeLine(pdf, layer.coats, { style, place: { x_pt: x_pt + width_pt - 6, y_pt: line_pt, align: 'right' } });
}

/** A build-up as the cross-section of its layers, the finish on top, the wood at the bottom; layers are given from the wood outwards. */
export function stripFigure(pdf: Pdf, layers: readonly DrawnLayer[], width_pt: number): Figure {
  const fromTop = layers.toReversed();
  const height_pt = fromTop.reduce((sum, layer) => sum + layerHeight(layer), 0);
  const draw = (x_pt: number, y_pt: number) => {
    let top_pt = y_pt;
    for (const layer of fromTop) {
      drawLayer(pdf, layer, { x_pt, y_pt: top_pt, width_pt, height_pt: layerHeight(layer) });
      top_pt += layerHeight(layer);
    }
    pdf.lineWidth(0.6).strokeColor(paperColours.ink).undash().rect(x_pt, y_pt, width_pt, height_pt).stroke();
  };
  const alt = fromTop.map(({ name, coats }) => (coats === '' ? name : `${name} (${coats})`)).join('; ');
  return { width_pt, height_pt, alt, draw };
}
