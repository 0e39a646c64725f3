import type { UsedBuildUp, UsedLayer } from '#shared/estimates/buildups-used';
import type { Figure } from './paper/figure';
import type { Pdf } from './paper/open-paper';
import { stripFigure, type DrawnLayer } from './paper/strip-figure';
import type { PaperWords } from './paper-words';

const isLeaf = ({ colour }: UsedLayer): boolean =>
  ['leaf', 'gold', 'silver', 'palladium', 'composition', 'aluminium'].includes(colour);

function layerName(layer: UsedLayer, used: UsedBuildUp, words: PaperWords): string {
  if (layer.colour === 'wood') return words.say('paper-layer-wood');
  return isLeaf(layer) && used.leaf.length > 0 ? used.leaf.join(' / ') : layer.name;
}

function coatsText({ colour, coats: [fewest, most] }: UsedLayer, words: PaperWords): string {
  if (colour === 'wood') return '';
  return fewest === most ? String(most) : words.say('paper-coats', { fewest, most });
}

/** The section strip of a build-up: its layers with their coats, leaf by the name it is bought under. */
export function drawnStrip(pdf: Pdf, used: UsedBuildUp, at: { words: PaperWords; width_pt: number }): Figure {
  const layers = used.layers.map((layer): DrawnLayer => ({
    name: layerName(layer, used, at.words),
    coats: coatsText(layer, at.words),
    colour: layer.colour,
    thickness: layer.thickness,
  }));
  return stripFigure(pdf, layers, at.width_pt);
}
