import type { System } from '#shared/buildups/buildup';
import type { LeafMetal } from '#shared/leaf/leaf-product';
import type { WordCode } from '#shared/words/word-code';

/** What a piece is finished with, as far as its care goes. */
export interface CareFacts {
  readonly systems: readonly System[];
  readonly metals: readonly LeafMetal[];
  readonly isOutdoors: boolean;
}

const tarnishing: readonly LeafMetal[] = ['silver', 'composition', 'aluminium'];

/** How the finished piece is cared for, gravest first; water gilding is tender, soft dry brush only, never damp. Trade practice, no source. */
export function careCodes({ systems, metals, isOutdoors }: CareFacts): WordCode[] {
  const has = (...wanted: System[]) => systems.some((system) => wanted.includes(system));
  return [
    ...(has('water') ? (['care-water-gilding'] as const) : []),
    ...(has('oil', 'water-borne-size') ? (['care-oil-gilding'] as const) : []),
    ...(has('glaze', 'paint') ? (['care-painted'] as const) : []),
    ...(metals.some((metal) => tarnishing.includes(metal)) ? (['care-sealed-metal'] as const) : []),
    ...(isOutdoors ? (['care-outdoors'] as const) : (['care-room'] as const)),
    'care-handling',
    'care-damage',
  ];
}
