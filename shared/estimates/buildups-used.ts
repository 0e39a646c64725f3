import type { StripLayer } from '#shared/buildups/section-strip';
import type { ZoneFigures } from '#shared/estimates/figures';

/** A layer as one or several zones get it: the fewest and the most coats, thickness as in the section strip. */
export interface UsedLayer extends Omit<StripLayer, 'coats'> {
  readonly coats: readonly [number, number];
}

/** A build-up of an estimate with its layers from the wood outwards, the zones that get it, and the leaf laid in it. */
export interface UsedBuildUp {
  readonly buildUp: string;
  readonly zoneIds: readonly string[];
  readonly leaf: readonly string[];
  readonly layers: readonly UsedLayer[];
}

function widened(known: UsedLayer | undefined, layer: StripLayer): UsedLayer {
  const [fewest, most] = known?.coats ?? [layer.coats, layer.coats];
  const coats = [Math.min(fewest, layer.coats), Math.max(most, layer.coats)] as const;
  return { ...layer, thickness: Math.max(known?.thickness ?? 0, layer.thickness), coats };
}

/** A layer only some zones get goes where it stands in theirs: after the one before it there. */
function joined(layers: readonly UsedLayer[], more: readonly StripLayer[]): UsedLayer[] {
  const all = [...layers];
  more.forEach((layer, place) => {
    const at = all.findIndex((known) => known.stepId === layer.stepId);
    const before = all.findIndex((known) => known.stepId === more[place - 1]?.stepId);
    if (at >= 0) all[at] = widened(all[at], layer);
    else all.splice(before + 1, 0, widened(undefined, layer));
  });
  return all;
}

function usedBuildUp(buildUp: string, zones: readonly ZoneFigures[]): UsedBuildUp {
  return {
    buildUp,
    zoneIds: zones.map((zone) => zone.zoneId),
    leaf: [...new Set(zones.flatMap((zone) => (zone.leaf ? [zone.leaf.name] : [])))],
    layers: zones.reduce<UsedLayer[]>((layers, zone) => joined(layers, zone.layers), []),
  };
}

/** The build-ups used on zones, in the order they first appear, each once however many zones get it and whatever their coats. */
export function buildUpsUsed(zones: readonly ZoneFigures[]): UsedBuildUp[] {
  const layered = zones.filter((zone) => zone.layers.length > 1);
  return [...new Set(layered.map((zone) => zone.buildUp))].map((buildUp) =>
    usedBuildUp(
      buildUp,
      layered.filter((zone) => zone.buildUp === buildUp),
    ),
  );
}
