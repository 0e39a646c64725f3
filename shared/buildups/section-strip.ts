import type { BuildUp, BuildUpStep, LayerColour } from '#shared/buildups/buildup';
import { coatsOf } from '#shared/buildups/coats-of';
import { stepsDone } from '#shared/buildups/steps-done';
import type { ZoneFacts } from '#shared/buildups/zone-facts';
import type { LeafMetal } from '#shared/leaf/leaf-product';

/** One layer of the drawn cross-section, from the wood outwards. `thickness` is relative: a gesso coat draws 1, leaf and size thinner. */
export interface StripLayer {
  readonly stepId: string;
  readonly name: string;
  readonly coats: number;
  readonly colour: LayerColour | LeafMetal;
  readonly thickness: number;
  /** True thickness where the ground is counted in mm, else null: the layer is drawn, not measured. */
  readonly thickness_mm: number | null;
}

/** How thick one coat is drawn against a coat of gesso; leaf would vanish at true scale. */
const drawnCoat: Readonly<Record<LayerColour, number>> = {
  none: 0,
  wood: 6,
  size: 0.3,
  gesso: 1,
  'yellow-bole': 0.5,
  'red-bole': 0.5,
  leaf: 0.6,
  'oil-size': 0.4,
  shellac: 0.3,
  'coloured-ground': 0.6,
  tone: 0.3,
  white: 0.6,
  glaze: 0.4,
  varnish: 0.4,
  paint: 0.6,
};

const wood: StripLayer = {
  stepId: '',
  name: '',
  coats: 0,
  colour: 'wood',
  thickness: drawnCoat.wood,
  thickness_mm: null,
};

function layer(step: BuildUpStep, coats: number, metal: LeafMetal | null): StripLayer {
  const measured = step.groundPerCoat_mm > 0 ? step.groundPerCoat_mm * coats : null;
  const colour = step.colour === 'leaf' ? (metal ?? 'leaf') : step.colour;
  return {
    stepId: step.id,
    name: step.name,
    coats,
    colour,
    thickness: drawnCoat[step.colour] * coats,
    thickness_mm: measured,
  };
}

/** The layers of a build-up on a zone as its section strip draws them, wood first, steps that leave no layer left out; `metal` colours the leaf. */
export function sectionStrip(buildUp: BuildUp, facts: ZoneFacts, metal: LeafMetal | null): StripLayer[] {
  const layers = stepsDone(buildUp, facts)
    .filter((step) => step.colour !== 'none')
    .map((step) => layer(step, coatsOf(step, facts), metal));
  return [wood, ...layers.filter((one) => one.coats > 0)];
}
