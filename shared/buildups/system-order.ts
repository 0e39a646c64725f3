import type { System } from '#shared/buildups/buildup';

/** Systems of one member in working order: water is gilded and burnished before anything oily comes near it; bare wood is last, untouched. */
export const systemOrder: readonly System[] = ['water', 'paint', 'glaze', 'water-borne-size', 'oil', 'bare'];

/** The place of a system in working order, from 0. */
export const systemRank = (system: System): number => systemOrder.indexOf(system);
