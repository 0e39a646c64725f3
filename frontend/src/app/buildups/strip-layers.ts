import type { StripLayer as WorkedLayer } from '#shared/buildups/section-strip';
import type { StripLayer, StripTone } from '../ui/drawing/strip-layer';

/** What the layers cannot say themselves: the timber beneath them, the leaf on them. */
export interface StripNames {
  readonly timber: string;
  readonly leaf: string;
}

const tones: Readonly<Record<WorkedLayer['colour'], StripTone>> = {
  none: 'sealer',
  wood: 'wood',
  size: 'size',
  gesso: 'gesso',
  'yellow-bole': 'yellow-bole',
  'red-bole': 'red-bole',
  leaf: 'gold',
  gold: 'gold',
  silver: 'silver',
  palladium: 'silver',
  aluminium: 'silver',
  composition: 'metal',
  'oil-size': 'oil-size',
  shellac: 'sealer',
  'coloured-ground': 'paint',
  tone: 'toner',
  white: 'white',
  glaze: 'glaze',
  varnish: 'varnish',
  paint: 'paint',
};

const metals: readonly WorkedLayer['colour'][] = ['leaf', 'gold', 'silver', 'palladium', 'composition', 'aluminium'];

/** So many coats of gesso are drawn as thick as a layer gets. */
const thickest = 4;

function labelOf({ colour, name }: WorkedLayer, { timber, leaf }: StripNames): string {
  if (colour === 'wood') return timber;
  return metals.includes(colour) && leaf ? leaf : name;
}

/** The layers of a build-up as the section strip draws them, the finish on top and the wood at the bottom. */
export const stripLayers = (layers: readonly WorkedLayer[], names: StripNames): StripLayer[] =>
  [...layers].reverse().map((layer) => ({
    label: labelOf(layer, names),
    count: layer.coats > 0 ? String(layer.coats) : undefined,
    tone: tones[layer.colour],
    weight: 1 + Math.min(1, layer.thickness / thickest / 2),
  }));
